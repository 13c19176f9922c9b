import canonicalize from 'canonicalize';
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Job } from './job.js';

/** The resolved job as canonical JSON text (RFC 8785): keys sorted, numbers in their shortest form, no space. */
export function canonicalText(job: Job): string {
  const text = canonicalize(job);
  if (text === undefined) throw new TypeError('a job has no canonical text');
  return text;
}

/**
 * SHA-256 of the canonical text of the resolved job, "sha256:" and 64 hexadecimal digits. It covers the SI values, not
 * the units in which they were entered; the order of keys plays no part.
 */
export function jobDigest(job: Job): string {
  return `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalText(job))))}`;
}
