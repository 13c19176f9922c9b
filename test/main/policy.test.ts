import { expect, it } from 'vitest';
import { CONTENT_SECURITY_POLICY, POLICY_HEADERS } from '../../main/policy.js';

it('lets the page load its own files and speak to its own host, and nothing else', () => {
  expect(CONTENT_SECURITY_POLICY).toBe(
    "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:; font-src 'self'; " +
      "connect-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
  );
  expect(CONTENT_SECURITY_POLICY).not.toMatch(/unsafe|\*|http/);
});

it('refuses powers, guesses at types, and telling others where a request came from', () => {
  expect(POLICY_HEADERS).toMatchObject({
    'Referrer-Policy': 'no-referrer',
    'X-Content-Type-Options': 'nosniff',
    'Cross-Origin-Opener-Policy': 'same-origin',
    'Cross-Origin-Resource-Policy': 'same-origin',
  });
  expect(POLICY_HEADERS['Permissions-Policy']).toContain('camera=()');
});
