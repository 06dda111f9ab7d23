import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';

/** When a process started, in words of the operating system; null when there is no such process. Only good for comparing. */
export function processStart(pid: number): string | null {
  try {
    process.kill(pid, 0);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ESRCH') return null;
  }
  try {
    // Field 22 of proc(5) stat, counted after the name, which may hold blanks and brackets.
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? null : `ticks ${fields[19]}`;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
  }
  return startByPs(pid);
}

/** Systems without /proc. Where ps is missing too, a living process of that number is taken for the holder. */
function startByPs(pid: number): string {
  try {
    return execFileSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' }).trim();
  } catch {
    return 'unknown';
  }
}
