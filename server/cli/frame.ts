import { runFrame } from './run-frame.ts';

/** `npm run frame`: a frame file to its layer set, without a server or a database. */
try {
  process.exitCode = await runFrame(process.argv.slice(2), new Date().toISOString().slice(0, 10), {
    out: (text) => process.stdout.write(text),
    err: (text) => process.stderr.write(text),
  });
} catch (error) {
  // A mistake of the program: 1 would say that the frame has a stop.
  console.error(error);
  process.exitCode = 3;
}
