import { spawnSync } from 'node:child_process';
import { isThere, READERS, type Reader } from './readers.ts';

/** Before the tests: finds the programs that they hold our files against, and gets the missing ones where that is allowed. */

const apt = (args: string[]) =>
  spawnSync('apt-get', args, {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  });

const mayInstall = () =>
  process.getuid?.() === 0 && spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status === 0;

function install(missing: readonly Reader[]): void {
  const packages = [...new Set(missing.map((reader) => reader.packageName))];
  console.log(`Installing with apt-get: ${packages.join(', ')}`);
  apt(['update', '-qq']);
  const run = apt(['install', '-y', '-qq', '--no-install-recommends', ...packages]);
  if (run.status !== 0) console.error(`apt-get ended with ${run.status}`);
}

function tellWhatToDo(missing: readonly Reader[]): void {
  console.error('The tests read the product’s files with programs that are not here:');
  for (const reader of missing) {
    console.error(`  ${reader.name} (${reader.usedFor}): tried ${reader.command} ${reader.probe.join(' ')}`);
  }
  const packages = [...new Set(missing.map((reader) => reader.packageName))].join(' ');
  console.error(`On Debian or Ubuntu:  sudo apt-get update && sudo apt-get install -y ${packages}`);
  console.error('A Chromium elsewhere than /usr/bin/chromium: set CHROMIUM to its path.');
}

let missing = READERS.filter((reader) => !isThere(reader));
if (missing.length > 0 && mayInstall()) {
  install(missing);
  missing = READERS.filter((reader) => !isThere(reader));
}
if (missing.length > 0) {
  tellWhatToDo(missing);
  process.exitCode = 1;
} else {
  console.log(`Readers found: ${READERS.map((reader) => reader.name).join(', ')}`);
}
