import { createRequire } from 'node:module';
import { join } from 'node:path';
import { cruise, type IConfiguration, type ICruiseResult } from 'dependency-cruiser';

export const RULES = createRequire(import.meta.url)('./.dependency-cruiser.cjs') as IConfiguration;

/** Follows all imports under the given folders of a tree and holds them against the rules. */
export async function cruiseTree(baseDir: string, folders: string[], tsConfig?: string): Promise<ICruiseResult> {
  const { output } = await cruise(folders, {
    ...RULES.options,
    baseDir,
    validate: true,
    ruleSet: { forbidden: RULES.forbidden ?? [] },
    ...(tsConfig ? { tsConfig: { fileName: join(baseDir, tsConfig) } } : {}),
  });
  if (typeof output === 'string') throw new Error(`a report in words came back: ${output}`);
  return output;
}
