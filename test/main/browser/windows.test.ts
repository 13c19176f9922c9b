import { expect, it } from 'vitest';
import { openWindows } from '../../../main/browser/windows.js';
import type { Desk, WindowService } from '../../../main/calls/desk.js';

interface Counted extends Desk {
  readonly opened: WindowService[];
  readonly closed: WindowService[];
}

function countedDesk(): Counted {
  const opened: WindowService[] = [];
  const closed: WindowService[] = [];
  const openWindow = (): WindowService => {
    const service: WindowService = {
      ask: () => Promise.resolve({ answer: null }),
      follow: () => () => undefined,
      close: () => {
        closed.push(service);
        return Promise.resolve();
      },
    };
    opened.push(service);
    return service;
  };
  return { opened, closed, openWindow, settled: () => Promise.resolve() };
}

it('are ready before the first page asks, and each page has its own', () => {
  const desk = countedDesk();
  const windows = openWindows(desk);
  expect(desk.opened).toHaveLength(1);
  expect(windows.of('one')).toBe(desk.opened[0]);
  expect(windows.of('two')).not.toBe(windows.of('one'));
  expect(windows.of('one')).toBe(desk.opened[0]);
  expect(desk.opened).toHaveLength(2);
});

it('that were not heard of for the longest are let go where there are too many', () => {
  const desk = countedDesk();
  const windows = openWindows(desk);
  const [one, two] = ['one', 'two', 'three', 'four'].map((id) => windows.of(id));
  windows.of('one');
  windows.of('five');
  expect(desk.closed).toEqual([two]);
  expect(windows.of('one')).toBe(one);
});

it('are all closed with their host, the one that waits too', async () => {
  const desk = countedDesk();
  await openWindows(desk).close();
  expect(desk.closed).toEqual(desk.opened);
  const used = openWindows(desk);
  used.of('one');
  await used.close();
  expect(desk.closed).toEqual(desk.opened);
});
