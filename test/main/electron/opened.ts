import { onTestFinished } from 'vitest';
import { openDesk, type Desk } from '../../../main/calls/desk.js';
import { fileMemory } from '../../../main/calls/memory.js';
import { runApp, type AppMeans } from '../../../main/electron/run.js';
import { FILES } from '../browser/opened.js';
import { WORKER } from '../solver/workers.js';
import { temporaryFolder } from '../temporary.js';
import { ElectronDouble } from './double.js';

/** The app over a double of Electron, and the lines of its log. */
export interface OpenedApp {
  readonly electron: ElectronDouble;
  readonly log: string[];
  readonly folder: string;
  readonly close: () => Promise<void>;
}

/** Runs the app over a double, with a desk as it is. */
export async function openedApp(
  folder: string,
  own: Partial<AppMeans> = {},
  electron = new ElectronDouble(),
): Promise<OpenedApp> {
  const log: string[] = [];
  const note = (line: string): void => {
    log.push(line);
  };
  const desk: Desk = await openDesk({ worker: WORKER, folder, log: note });
  const services: { close(): Promise<void> }[] = [];
  const noted: Desk = {
    ...desk,
    openWindow: () => {
      const service = desk.openWindow();
      services.push(service);
      return service;
    },
  };
  await runApp(electron.api, {
    folder,
    preload: '/built/preload.cjs',
    platform: 'linux',
    files: () => Promise.resolve(FILES),
    desk: () => Promise.resolve(noted),
    placement: fileMemory(`${folder}/window.json`, 'The place of the window', note),
    log: note,
    ...own,
  });
  const close = async (): Promise<void> => {
    await Promise.all([desk.settled(), ...services.map((service) => service.close())]);
  };
  return { electron, log, folder, close };
}

/** The app over a double, ended with its test. */
export async function testApp(own: Partial<AppMeans> = {}, electron = new ElectronDouble()): Promise<OpenedApp> {
  const opened = await openedApp(temporaryFolder(), own, electron);
  onTestFinished(opened.close);
  return opened;
}
