import { join } from 'node:path';
import { buildProduct } from './build-product.ts';

try {
  await buildProduct(join(import.meta.dirname, '../..'), console.log);
  console.log('Built into dist/');
} catch (error) {
  console.error((error as Error).message);
  process.exitCode = 1;
}
