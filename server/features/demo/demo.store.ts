import type { Database } from '../../db/database.ts';
import { shops } from '../../db/schema.ts';

export type DemoStore = ReturnType<typeof demoStore>;

export const demoStore = (database: Database) => ({
  /** True until the first shop is opened. */
  async isEmpty(): Promise<boolean> {
    return (await database.queries.$count(shops)) === 0;
  },
});
