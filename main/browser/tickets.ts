import { randomBytes } from 'node:crypto';

/** Addresses that let one page in, once. */
export interface Tickets {
  issue(): string;
  /** whether a ticket is good; it is not any more afterwards */
  spend(ticket: string): boolean;
}

/** How long a browser may take to start, ms. */
const GOOD_FOR = 60_000;

/**
 * Tickets stand in for the token in a browser's command line, which every user of the machine may read: by the time
 * that somebody does, the browser has spent its ticket.
 */
export function newTickets(now: () => number = () => performance.now()): Tickets {
  const issued = new Map<string, number>();
  return {
    issue: () => {
      const ticket = randomBytes(32).toString('base64url');
      issued.set(ticket, now());
      return ticket;
    },
    spend: (ticket) => {
      const since = issued.get(ticket);
      issued.delete(ticket);
      return since !== undefined && now() - since <= GOOD_FOR;
    },
  };
}
