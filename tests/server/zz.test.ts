import { test } from 'vitest';
import { startTestServer } from '../setup/test-server.ts';
import { openShopWithFrame, releaseFrame } from '../builders/shops.ts';
test('x', async () => {
  let t = Date.now();
  const s = await startTestServer(); console.log('start', Date.now()-t);
  t=Date.now(); const { visitor, frame } = await openShopWithFrame(s); console.log('frame', Date.now()-t, frame.version);
  t=Date.now(); const f = await releaseFrame(visitor, frame).catch(e=>e); console.log('release', Date.now()-t, f);
  t=Date.now(); await s.close(); console.log('close', Date.now()-t);
});
