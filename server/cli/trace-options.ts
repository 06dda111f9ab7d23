import { parseArgs } from 'node:util';
import { traceOptions } from '#shared/contracts/tracings.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { PLAIN_TRACE, type TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { UsageError } from './usage-error.ts';

export const TRACE_USAGE = `Reads somebody's DXF and prints what is in it as JSON: unit, census of its entities, problems, frames.

  npm run trace -- FILE.dxf [--unit in|mm] [--tolerance MM] [--arcs MM] [--view front|back]
                           [--leave-out LAYER]…

  FILE               DXF file, ASCII; - reads standard input
  --unit in|mm       what the numbers are, where the file does not say or is wrong
  --tolerance MM     gaps up to this are closed (default: ${PLAIN_TRACE.gap})
  --arcs MM          runs of short lines within this of an arc become one (default: they stay lines)
  --view front|back  face that the drawing shows; a back is mirrored (default: ${PLAIN_TRACE.view})
  --leave-out LAYER  entities on this layer are set aside; can be given several times
  --help             this text

Exit code: 0 at least one frame; 1 nothing usable, or the unit is not known: the reasons are among the problems and on
standard error; 2 the command cannot be understood, or the file is no DXF or beyond the limits; 3 a mistake of the program.
`;

const OPTIONS = {
  unit: { type: 'string' },
  tolerance: { type: 'string' },
  arcs: { type: 'string' },
  'leave-out': { type: 'string', multiple: true, default: [] as string[] },
  view: { type: 'string', default: PLAIN_TRACE.view },
  help: { type: 'boolean', default: false },
} as const;

/** Reads the command's arguments; 'help' when that was asked for. Throws UsageError. */
export function readTraceOptions(args: readonly string[]): { file: string; options: TraceOptions } | 'help' {
  let parsed;
  try {
    parsed = parseArgs({ args: [...args], options: OPTIONS, allowPositionals: true });
  } catch (error) {
    throw new UsageError((error as Error).message);
  }
  const { values, positionals } = parsed;
  if (values.help) return 'help';
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0)
    throw new UsageError(`got ${positionals.length} files, takes one DXF file, or - for standard input`);
  const asked = {
    ...PLAIN_TRACE,
    unit: values.unit ?? null,
    view: values.view,
    leaveOut: values['leave-out'],
    ...(values.tolerance === undefined ? {} : { gap: Number(values.tolerance) }),
    ...(values.arcs === undefined ? {} : { arcs: Number(values.arcs) }),
  };
  const read = traceOptions.safeParse(asked);
  if (read.success) return { file, options: read.data };
  const flag = (path: string): string =>
    path === 'gap' ? '--tolerance' : path.startsWith('leaveOut') ? '--leave-out' : `--${path}`;
  throw new UsageError(
    fieldErrors(read.error, asked)
      .map(({ path, got, takes }) => `${flag(path)}: got ${got}, takes ${takes}`)
      .join('\n'),
  );
}
