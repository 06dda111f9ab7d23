import { openInMemory } from './db/open-embedded.ts';
import { readFileSync, writeFileSync, existsSync } from 'node:fs';
const f='/tmp/server-dev/migrated.tar';
if (!existsSync(f)) { const d = await openInMemory('drizzle'); writeFileSync(f, Buffer.from(await (await d.dump()).arrayBuffer())); await d.close(); }
let t=Date.now(); const e = await openInMemory('drizzle', new Blob([readFileSync(f)])); console.log('load',Date.now()-t);
console.log(await e.queries.execute('select 1 as a'));
await e.close();
