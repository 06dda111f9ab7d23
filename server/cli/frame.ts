import { runFrame } from './run-frame.ts';

/** `npm run frame`: a frame file to its layer set, without a server or a database. */
process.exitCode = await runFrame(process.argv.slice(2), new Date().toISOString().slice(0, 10), {
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
});
