import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readConfig } from '../../server/config.ts';
import { sessionSecret } from '../../server/session-secret.ts';

describe('readConfig', () => {
  it('When nothing is set, then it listens on this machine only', () => {
    expect(readConfig({})).toMatchObject({
      port: 4300,
      host: '127.0.0.1',
      dataDir: './data',
      databaseUrl: undefined,
      trustProxy: 0,
      production: false,
    });
  });

  it('When a variable is empty, then it counts as absent', () => {
    expect(readConfig({ PORT: '', DATABASE_URL: '' })).toMatchObject({ port: 4300, databaseUrl: undefined });
  });

  it('When variables are wrong, then each one is named with what it got and takes', () => {
    expect(() =>
      readConfig({ PORT: '70000', TRUST_PROXY: 'true', DATABASE_URL: 'mysql://x', SESSION_SECRET: 'short' }),
    ).toThrow(
      /PORT: got "70000", takes a whole number from 0 to 65535\n.*DATABASE_URL: got "mysql:\/\/x", takes postgres:.*\nTRUST_PROXY: got "true".*\nSESSION_SECRET: got "short"/s,
    );
  });
});

describe('sessionSecret', () => {
  it('When there is none, then one is made that only its owner can read, and kept', () => {
    const folder = mkdtempSync(join(tmpdir(), 'stilepost-secret-'));
    const secret = sessionSecret(folder);
    expect(secret).toMatch(/^[0-9a-f]{64}$/);
    expect(sessionSecret(folder)).toBe(secret);
    const path = join(folder, 'session-secret');
    expect(statSync(path).mode & 0o777).toBe(0o600);
    expect(readFileSync(path, 'utf8')).toBe(secret);
    writeFileSync(path, 'short');
    expect(() => sessionSecret(folder)).toThrow('takes at least 32');
    rmSync(folder, { recursive: true });
  });
});
