import { httpDesk } from '../browser/client.js';
import { openedHost } from '../browser/opened.js';
import { testContract } from './suite.js';

testContract('the browser host', async (folder) => {
  const { host } = await openedHost(folder);
  return { desk: httpDesk(host.gate), close: () => host.close() };
});
