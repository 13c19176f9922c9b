import { expect, it } from 'vitest';
import { newTickets } from '../../../main/browser/tickets.js';

it('are good once, for a minute', () => {
  let time = 0;
  const tickets = newTickets(() => time);
  const [one, two] = [tickets.issue(), tickets.issue()];
  expect(one).toMatch(/^[A-Za-z0-9_-]{43}$/);
  expect(tickets.spend(one)).toBe(true);
  expect(tickets.spend(one)).toBe(false);
  time = 60_001;
  expect(tickets.spend(two)).toBe(false);
  expect(tickets.spend('')).toBe(false);
});
