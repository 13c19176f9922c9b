import type { AnyLine, Service } from '../calls/service.js';
import { ASKS, FOLLOWS, type FollowName, type Refusal } from '../contract.js';
import { channelOfAsk, channelOfFollow, channelOfLines, channelOfStop } from './channels.js';
import type { ElectronApi, IpcCall, WebContentsApi } from './electronApi.js';
import { isOwnCall } from './security.js';

const STRANGER: Refusal = { code: 'not-allowed', sentence: 'The call does not come from the window.' };
const NO_RUN: Refusal = { code: 'bad-arguments', sentence: 'The run has no number of its own.' };

/** The window that is open, and its calls. */
export interface OpenPage {
  readonly page: WebContentsApi;
  readonly service: Service;
  /** the runs in flight, by call and number */
  readonly runs: Map<string, Flight>;
}

/** A run in flight. */
interface Flight {
  stop: () => void;
}

/** A new page's calls. */
export function openPage(page: WebContentsApi, service: Service): OpenPage {
  return { page, service, runs: new Map() };
}

/** Stops all runs and hears no more of them: the page is gone, or was loaded anew and counts from the beginning. */
export function stopAll({ runs }: OpenPage): void {
  const all = [...runs.values()];
  runs.clear();
  for (const run of all) run.stop();
}

const keyOf = (name: FollowName, run: number): string => `${name} ${run}`;

function isRun(run: unknown): run is number {
  return typeof run === 'number' && Number.isSafeInteger(run) && run > 0;
}

/** Begins a run, whose lines go to the page; returns why it was refused at once, or null. */
function follow({ page, service, runs }: OpenPage, name: FollowName, run: unknown, args: unknown): string | null {
  const send = (line: AnyLine): void => {
    if (!page.isDestroyed()) page.send(channelOfLines(name), run, line);
  };
  if (!isRun(run) || runs.has(keyOf(name, run))) {
    send({ refusal: NO_RUN });
    return NO_RUN.sentence;
  }
  const key = keyOf(name, run);
  const flight: Flight = { stop: () => undefined };
  const refusals: string[] = [];
  runs.set(key, flight);
  flight.stop = service.follow(name, args, (line) => {
    if (runs.get(key) !== flight) return;
    if ('refusal' in line) refusals.push(line.refusal.sentence);
    if ('end' in line || 'refusal' in line) runs.delete(key);
    send(line);
  });
  return refusals[0] ?? null;
}

/**
 * Registers a handler for each call of the contract. Each looks first at who calls: anything but the main frame of the
 * open window's own page is refused, with a line in the log.
 * @param current the open window's page, or null
 */
export function handleCalls(
  ipcMain: ElectronApi['ipcMain'],
  current: () => OpenPage | null,
  log: (line: string) => void,
): void {
  const own = (call: IpcCall, channel: string): OpenPage | null => {
    const open = current();
    if (open !== null && isOwnCall(call, open.page)) return open;
    log(`refused ${channel}: ${STRANGER.sentence}`);
    return null;
  };
  for (const name of ASKS) {
    const channel = channelOfAsk(name);
    ipcMain.handle(channel, async (call, args) => {
      const open = own(call, channel);
      if (open === null) return { refusal: STRANGER };
      const reply = await open.service.ask(name, args);
      if ('refusal' in reply) log(`refused ${channel}: ${reply.refusal.sentence}`);
      return reply;
    });
  }
  for (const name of FOLLOWS) {
    const channel = channelOfFollow(name);
    ipcMain.on(channel, (call, run, args) => {
      const open = own(call, channel);
      const refused = open === null ? null : follow(open, name, run, args);
      if (refused !== null) log(`refused ${channel}: ${refused}`);
    });
    ipcMain.on(channelOfStop(name), (call, run) => {
      const open = own(call, channelOfStop(name));
      if (isRun(run)) open?.runs.get(keyOf(name, run))?.stop();
    });
  }
}
