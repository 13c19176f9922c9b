// @vitest-environment happy-dom
import { describe, expect, it } from 'vitest';
import { copyInstead, rowText } from '../../../renderer/lineup/copyText.js';
import { ranking } from '../../../renderer/lineup/ranking.js';
import { lineUpRows } from '../../../renderer/lineup/rows.js';
import { fitting, inHand, results, unfit } from './ranked.js';

const rows = lineUpRows(
  ranking(results([fitting('a', 1), fitting('b', 1.5), unfit('c')], [inHand('shelf\t1', 'a', 0.9)])),
  'SI',
);

/** A copy event as a browser sends it, and what was put on its clipboard. */
function copying(): { readonly event: Event; readonly put: [string, string][] } {
  const put: [string, string][] = [];
  const event = new Event('copy', { cancelable: true });
  Object.defineProperty(event, 'clipboardData', {
    value: { setData: (type: string, text: string) => put.push([type, text]) },
  });
  return { event, put };
}

describe('rowText', () => {
  it('sets the fields apart by tabs, with a minus that a spreadsheet reads', () => {
    expect(rows.map(rowText)).toEqual([
      '1\tshelf 1\t90.0\t2.00\t0.9000\t-0.1000\t-10\t3.00\ttwist\t',
      '2\ta steel, drawn tube\t90.0\t2.00\t1.0000\t\t\t3.00\ttwist\t',
      '3\tb steel, drawn tube\t90.0\t2.00\t1.5000\t0.5000\t+50\t3.00\ttwist\t',
      '\tc steel, drawn tube\tnothing fits: twist and outer diameter stand against each other',
    ]);
  });
});

describe('copyInstead', () => {
  it('puts the text in place of what the next copy would take, once', () => {
    copyInstead('a row', document);
    const [first, second] = [copying(), copying()];
    document.dispatchEvent(first.event);
    document.dispatchEvent(second.event);
    expect(first.put).toEqual([['text/plain', 'a row']]);
    expect(first.event.defaultPrevented).toBe(true);
    expect(second.put).toEqual([]);
    expect(second.event.defaultPrevented).toBe(false);
  });

  it('waits no longer than the key is held', () => {
    copyInstead('a row', document);
    document.dispatchEvent(new Event('keyup'));
    const later = copying();
    document.dispatchEvent(later.event);
    expect(later.put).toEqual([]);
  });
});
