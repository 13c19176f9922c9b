import path from 'node:path';
import * as electron from 'electron';
import { openDesk } from '../calls/desk.js';
import { fileMemory } from '../calls/memory.js';
import { stateFolder, thisHome } from '../calls/stateFolder.js';
import { rootFolder } from '../files/assets.js';
import { builtWorker } from '../solver/entry.js';
import { readWindowFiles } from '../windowFiles.js';
import type { ElectronApi } from './electronApi.js';
import { runApp } from './run.js';

const { app, BrowserWindow, ipcMain, Menu, protocol, screen, session } = electron;

const api: ElectronApi = {
  app,
  BrowserWindow,
  ipcMain,
  protocol,
  session,
  screen,
  Menu: {
    setApplicationMenu: (menu) => {
      Menu.setApplicationMenu(menu);
    },
    macMenu: (entries) => {
      Menu.setApplicationMenu(Menu.buildFromTemplate([...entries]));
    },
  },
};

const folder = stateFolder(thisHome());
const built = path.join(rootFolder(), 'dist');
const log = (line: string): void => {
  process.stderr.write(`${line}\n`);
};

runApp(api, {
  folder,
  preload: path.join(built, 'preload', 'preload.cjs'),
  platform: process.platform,
  files: () => readWindowFiles(path.join(built, 'renderer')),
  desk: () => openDesk({ worker: builtWorker(path.join(built, 'main')), folder, log }),
  placement: fileMemory(path.join(folder, 'window.json'), 'The place of the window', log),
  log,
}).catch((error: unknown) => {
  log(`Wringwall cannot start: ${error instanceof Error ? (error.message.split('\n')[0] ?? '') : String(error)}`);
  app.exit(1);
});
