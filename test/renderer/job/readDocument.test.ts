import { describe, expect, it } from 'vitest';
import { readDocument } from '../../../renderer/job/readDocument.js';
import { readJob } from '../../../src/job/read.js';
import { buildLibrary, buildStockLists, rowsById } from '../../../src/material/library.js';
import { LISTS, RECORDS, smallJob } from '../window.js';

const lists = rowsById(buildStockLists(LISTS));
const library = buildLibrary(RECORDS, lists);
const row = { outerDiameter: '50 mm', wall: '1.5 mm' };

describe('readDocument', () => {
  it('reads a list of the user’s own as the engine does', () => {
    const job = smallJob({ sizes: { stock: [row, { outerDiameter: '2 in', wall: '0.065 in' }, row] } });
    const [mine, engine] = [readDocument(job, library, lists), readJob(job, library, lists)];
    if (!mine.ok || !engine.ok) throw new Error('the job is sound');
    expect(mine.brief.job).toEqual(engine.brief.job);
  });

  it('finds the mistakes of a list, and those elsewhere beside a sound one', () => {
    const wrong = smallJob({ sizes: { stock: [row, { outerDiameter: '50 mm', wall: '1 kg' }] } });
    expect(readDocument(wrong, library, lists)).toEqual(readJob(wrong, library, lists));
    const elsewhere = smallJob({ sizes: { stock: [row] }, tube: { length: 'long' } });
    expect(readDocument(elsewhere, library, lists)).toEqual(readJob(elsewhere, library, lists));
  });

  it('reads a long list once', () => {
    let reads = 0;
    const counted = { ...row };
    Object.defineProperty(counted, 'wall', { enumerable: true, get: () => ((reads += 1), '1.5 mm') });
    const stock = [counted];
    readDocument(smallJob({ sizes: { stock } }), library, lists);
    const first = reads;
    readDocument(smallJob({ sizes: { stock }, title: 'another' }), library, lists);
    expect(first).toBeGreaterThan(0);
    expect(reads).toBe(first);
  });
});
