import { exposedTo } from '../../../main/electron/exposed.js';
import { exposedDesk } from '../electron/client.js';
import { openedApp } from '../electron/opened.js';
import { testContract } from './suite.js';

testContract('Electron', async (folder) => {
  const { electron, close } = await openedApp(folder);
  return { desk: exposedDesk(exposedTo(electron.preloadIpc())), close };
});
