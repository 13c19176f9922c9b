import type { Browser, Page } from 'playwright-core';

/** An event of a trace, as far as it is looked at; times in microseconds. */
interface TraceEvent {
  readonly name: string;
  readonly pid: number;
  readonly tid: number;
  readonly dur?: number;
  readonly args?: { readonly name?: string };
}

const MAIN_THREAD = 'CrRendererMain';

/** The longest task of the page's main thread while something is done, ms. */
export async function longestTask(browser: Browser, page: Page, act: () => Promise<void>): Promise<number> {
  await browser.startTracing(page, { categories: ['toplevel', 'devtools.timeline', '__metadata'] });
  await act();
  const { traceEvents } = JSON.parse((await browser.stopTracing()).toString('utf8')) as {
    readonly traceEvents: readonly TraceEvent[];
  };
  const threads = traceEvents.filter(({ name, args }) => name === 'thread_name' && args?.name === MAIN_THREAD);
  const main = new Set(threads.map(({ pid, tid }) => `${pid} ${tid}`));
  const tasks = traceEvents.filter(({ name, pid, tid }) => name.endsWith('RunTask') && main.has(`${pid} ${tid}`));
  if (tasks.length === 0) throw new Error('the trace holds no tasks');
  return tasks.reduce((longest, { dur = 0 }) => Math.max(longest, dur), 0) / 1000;
}
