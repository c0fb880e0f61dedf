import path from 'node:path';
import { anyFreePort } from '../machine/free-port.mjs';
import { startProduct } from './started-product.mjs';
import { runTool } from './child.mjs';
import { playwrightTally, tallyFrom } from './tally.mjs';

/** Browser tests against a product of their own: data directory, ports and database; a running `npm start` is not touched. @type {import('./parts.mjs').TestPart} */
export const browserPart = {
  name: 'browser',
  needs: { mariadbd: 'mariadb-server', chromium: 'chromium' },
  run: async (place) => {
    const { root, scratch } = place;
    const report = path.join(scratch, 'browser.json');
    const product = await startProduct({ root, dataFolder: path.join(scratch, 'browser-data'), env: { PORT: String(await anyFreePort()) } });
    try {
      const code = await runTool([path.join(root, 'node_modules/@playwright/test/cli.js'), 'test'], place, {
        E2E_ADDRESS: product.address, E2E_ACCOUNTS: JSON.stringify(product.accounts), E2E_DATA_DIR: product.dataFolder, PLAYWRIGHT_JSON_OUTPUT_FILE: report,
      });
      return tallyFrom(report, code, playwrightTally);
    } finally {
      await product.stop();
    }
  },
};
