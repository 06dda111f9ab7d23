import { spawnSync } from 'node:child_process';

/** A program from outside the product that tests hold its files against. */
export interface Reader {
  readonly name: string;
  readonly command: string;
  /** Arguments of a run that ends with 0 when the program is there and works. */
  readonly probe: readonly string[];
  /** Debian's package that brings it. */
  readonly packageName: string;
  readonly usedFor: string;
}

/** Debian's own Python: its packages (ezdxf) are not seen by a Python from elsewhere that may come first in PATH. */
export const PYTHON = '/usr/bin/python3';
export const CHROMIUM = process.env['CHROMIUM'] ?? '/usr/bin/chromium';

export const READERS: readonly Reader[] = [
  { name: 'Chromium', command: CHROMIUM, probe: ['--version'], packageName: 'chromium', usedFor: 'driving the pages' },
  {
    name: 'ezdxf',
    command: PYTHON,
    probe: ['-c', 'import ezdxf'],
    packageName: 'python3-ezdxf',
    usedFor: 'auditing DXFs',
  },
  { name: 'ogrinfo', command: 'ogrinfo', probe: ['--version'], packageName: 'gdal-bin', usedFor: 'reading DXFs' },
  {
    name: 'LibreCAD',
    command: 'librecad',
    probe: ['dxf2pdf', '-v'],
    packageName: 'librecad',
    usedFor: 'plotting DXFs',
  },
  {
    name: 'pdftotext',
    command: 'pdftotext',
    probe: ['-v'],
    packageName: 'poppler-utils',
    usedFor: 'reading setup sheets',
  },
  {
    name: 'pdftoppm',
    command: 'pdftoppm',
    probe: ['-v'],
    packageName: 'poppler-utils',
    usedFor: 'looking at setup sheets',
  },
  { name: 'sha256sum', command: 'sha256sum', probe: ['--version'], packageName: 'coreutils', usedFor: 'checking zips' },
];

/** Flags for a Chromium that no person sees: no network of its own, no sandbox as root, no first-run pages. */
export const CHROMIUM_FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** True when the program is there and its probe ends with 0. */
export function isThere(reader: Reader): boolean {
  const run = spawnSync(reader.command, reader.probe, {
    stdio: 'ignore',
    timeout: 60_000,
    env: { ...process.env, QT_QPA_PLATFORM: 'offscreen' },
  });
  return run.status === 0;
}
