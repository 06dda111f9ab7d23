import { join } from 'node:path';
import { buildWhenChanged } from '../../server/cli/build-product.ts';
import { runServer } from './run-server.ts';

/** Once for all Playwright tests: builds the product if need be and serves it; the address goes to the tests as PRODUCT_URL. */
export default async function serveProduct(): Promise<() => Promise<void>> {
  await buildWhenChanged(join(import.meta.dirname, '../..'), console.log);
  const server = await runServer();
  process.env['PRODUCT_URL'] = server.url;
  return server.stop;
}
