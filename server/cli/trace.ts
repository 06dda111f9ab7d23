import { runTrace } from './run-trace.ts';

/** `npm run trace`: somebody's drawing to the frames in it, as JSON, without a server or a database. */
try {
  process.exitCode = runTrace(process.argv.slice(2), {
    out: (text) => process.stdout.write(text),
    err: (text) => process.stderr.write(text),
  });
} catch (error) {
  // A mistake of the program: 1 would say that the drawing holds nothing.
  console.error(error);
  process.exitCode = 3;
}
