import { basename, join } from 'node:path';
import { readerBytes, runReader } from './run-reader.ts';

/** Plots DXF files to PDF with LibreCAD, all in one process, and returns for each how many dark dots the plot has. */
export function plotWithLibrecad(paths: readonly string[], folder: string): number[] {
  runReader('librecad', ['dxf2pdf', '-a', '-m', '-t', folder, ...paths]);
  return paths.map((path) => {
    const pdf = join(folder, `${basename(path, '.dxf')}.pdf`);
    const grey = readerBytes('pdftoppm', ['-gray', '-scale-to', '600', '-singlefile', pdf]);
    // A PGM: magic, width, height, highest value, one white space, then a byte a dot (netpbm, "pgm").
    const head = /^P5\s+\d+\s+\d+\s+\d+\s/.exec(grey.subarray(0, 64).toString('latin1'))![0].length;
    return grey.subarray(head).reduce((dark, dot) => dark + (dot < 128 ? 1 : 0), 0);
  });
}
