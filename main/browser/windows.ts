import type { Desk, WindowService } from '../calls/desk.js';

/** How many windows have a worker of their own; a page that was reloaded counts until its turn is over. */
const MOST_WINDOWS = 4;

/** The calls of each window, by the id that its page made for itself. */
export interface Windows {
  /** the calls of a window; the one that was not heard of for the longest is let go where there are too many */
  of(id: string): WindowService;
  close(): Promise<void>;
}

/** Keeps the windows of a host; one is ready before the first page asks. */
export function openWindows(desk: Desk): Windows {
  // the order of a map is that of insertion: the window heard of last stands last
  const open = new Map<string, WindowService>();
  let ready: WindowService | null = desk.openWindow();

  function take(): WindowService {
    const service = ready ?? desk.openWindow();
    ready = null;
    return service;
  }
  function letGo(): void {
    const [oldest] = open.keys();
    if (open.size <= MOST_WINDOWS || oldest === undefined) return;
    void open.get(oldest)?.close();
    open.delete(oldest);
  }
  return {
    of: (id) => {
      const service = open.get(id) ?? take();
      open.delete(id);
      open.set(id, service);
      letGo();
      return service;
    },
    close: async () => {
      const all = ready === null ? [...open.values()] : [ready, ...open.values()];
      open.clear();
      ready = null;
      await Promise.all(all.map((service) => service.close()));
    },
  };
}
