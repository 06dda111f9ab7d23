import { readFileSync } from 'node:fs';
import { applyRoles } from '#shared/kernel/tracing/frames/apply-roles.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import { NotTraceable } from '#shared/kernel/tracing/not-traceable.ts';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import type { TracedDrawing, TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { InputError } from './input-error.ts';
import type { Output } from './run-frame.ts';
import { readTraceOptions, TRACE_USAGE } from './trace-options.ts';
import { UsageError } from './usage-error.ts';

const STANDARD_INPUT = 0;

function load(path: string): Uint8Array {
  try {
    return readFileSync(path === '-' ? STANDARD_INPUT : path);
  } catch (error) {
    throw new InputError(`${path === '-' ? 'standard input' : path}: cannot be read (${(error as Error).message})`);
  }
}

/** The frames of a drawing with the roles that its loops are taken for, and what is to be said of those roles. */
function framesOf({ loops, unit }: TracedDrawing, view: TraceOptions['view']) {
  if (unit === null) {
    const message = 'The file does not say its unit: give --unit in or --unit mm.';
    return { frames: [], problems: [{ code: 'unit-unknown', message }] };
  }
  const roles = loops.map(({ role }) => role);
  const made = applyRoles(
    loops.map(({ vertices }) => ({ contour: contourOfVertices(vertices) })),
    roles,
    unit,
    { view },
  );
  return {
    frames: made.frames.map(({ width, height, outline }) => ({
      width,
      height,
      perimeter: outline.perimeter,
      openings: outline.openings,
    })),
    problems: made.problems.map(({ code, message, loop }) => ({
      code,
      message,
      ...(loop === null ? {} : { at: loops[loop]!.vertices[0]!.slice(0, 2) }),
    })),
  };
}

function trace(file: string, options: TraceOptions, output: Output): number {
  const drawing = traceDrawing(load(file), options);
  const { frames, problems } = framesOf(drawing, options.view);
  const { found: _found, loops, open, ...said } = drawing;
  const all = [...drawing.problems, ...problems];
  const answer = { ...said, problems: all, loops: loops.length, open: open.length, frames };
  output.out(`${JSON.stringify(answer, null, 2)}\n`);
  if (frames.length > 0) return 0;
  for (const { code, message } of all) output.err(`${code}: ${message}\n`);
  if (all.length === 0) output.err('The drawing holds no closed loop.\n');
  return 1;
}

/** The `trace` command; returns its exit code. */
export function runTrace(args: readonly string[], output: Output): number {
  try {
    const asked = readTraceOptions(args);
    if (asked !== 'help') return trace(asked.file, asked.options, output);
    output.out(TRACE_USAGE);
    return 0;
  } catch (error) {
    if (error instanceof UsageError) {
      output.err(`${error.message}\n\n${TRACE_USAGE}`);
      return 2;
    }
    if (error instanceof NotTraceable) {
      output.err(`${error.code}: ${error.message}\n`);
      return 2;
    }
    if (!(error instanceof InputError)) throw error;
    output.err(`${error.message}\n`);
    return 2;
  }
}
