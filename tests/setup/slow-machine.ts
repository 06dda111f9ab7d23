import { vi } from 'vitest';

/** Two minutes for each test and hook of a file: copying a database or starting a worker takes a second alone, but many on a busy machine. */
export const allowSlowMachine = (): void => vi.setConfig({ testTimeout: 120_000, hookTimeout: 120_000 });
