import { describe, expect, it } from 'vitest';
import { begun, closed, edited, MOST_STEPS, redone, undone, type History } from '../../../renderer/job/history.js';

const same = (one: number, other: number): boolean => one === other;
const after = (history: History<number>, next: number, group: string | null = null): History<number> =>
  edited(history, next, group, same);

describe('history', () => {
  it('goes back and forward, and stops at its ends', () => {
    const history = after(after(begun(1), 2), 3);
    const back = undone(undone(undone(history)));
    expect(back.present).toBe(1);
    expect(undone(back)).toBe(back);
    expect(redone(redone(redone(back))).present).toBe(3);
  });

  it('forgets what was undone once another edit is made', () => {
    const history = after(undone(after(begun(1), 2)), 5);
    expect(redone(history)).toBe(history);
    expect(undone(history).present).toBe(1);
  });

  it('takes edits of one group for one step', () => {
    const history = after(after(after(begun(1), 2, 'a'), 3, 'a'), 4, 'a');
    expect(undone(history).present).toBe(1);
  });

  it('begins a step with another group, and after a closed one', () => {
    expect(undone(after(after(begun(1), 2, 'a'), 3, 'b')).present).toBe(2);
    expect(undone(after(closed(after(begun(1), 2, 'a')), 3, 'a')).present).toBe(2);
  });

  it('leaves no step where a group ends as it began, nor where nothing changes', () => {
    expect(after(after(begun(1), 2, 'a'), 1, 'a').past).toEqual([]);
    const history = begun(1);
    expect(after(history, 1)).toBe(history);
  });

  it('does not join an edit to a step that was undone and redone', () => {
    const history = redone(undone(after(begun(1), 2, 'a')));
    expect(undone(after(history, 3, 'a')).present).toBe(2);
  });

  it('keeps the last steps alone', () => {
    let history = begun(0);
    for (let step = 1; step <= MOST_STEPS + 10; step += 1) history = after(history, step);
    expect(history.past).toHaveLength(MOST_STEPS);
    expect(history.past[0]).toBe(10);
  });
});
