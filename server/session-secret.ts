import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** The secret that signs session cookies, kept in the data folder so that a restart signs nobody out. Made when absent. */
export function sessionSecret(dataDir: string): string {
  const path = join(dataDir, 'session-secret');
  mkdirSync(dataDir, { recursive: true });
  try {
    writeFileSync(path, randomBytes(32).toString('hex'), { flag: 'wx', mode: 0o600 });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
  }
  const secret = readFileSync(path, 'utf8').trim();
  if (secret.length < 32)
    throw new Error(`${path} holds no usable secret: got ${secret.length} characters, takes at least 32`);
  return secret;
}
