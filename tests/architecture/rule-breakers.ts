/** A small tree that breaks one import rule. */
export interface RuleBreaker {
  readonly rule: string;
  readonly files: Record<string, string>;
  readonly folders: string[];
}

const imports = (...names: string[]) => names.map((name) => `import '${name}';\n`).join('');

/** A package as npm would install it. */
const packageFiles = (name: string) => ({
  [`node_modules/${name}/package.json`]: `{"name":"${name}","version":"1.0.0","main":"index.js"}`,
  [`node_modules/${name}/index.js`]: '',
});

export const RULE_BREAKERS: readonly RuleBreaker[] = [
  {
    rule: 'no-cycles',
    files: { 'shared/kernel/a.ts': imports('./b.ts'), 'shared/kernel/b.ts': imports('./a.ts') },
    folders: ['shared'],
  },
  { rule: 'everything-resolves', files: { 'shared/kernel/a.ts': imports('./gone.ts') }, folders: ['shared'] },
  {
    rule: 'kernel-imports-kernel-only',
    files: { 'shared/kernel/a.ts': imports('../contracts/b.ts'), 'shared/contracts/b.ts': '' },
    folders: ['shared'],
  },
  { rule: 'kernel-imports-kernel-only', files: { 'shared/kernel/a.ts': imports('node:fs') }, folders: ['shared'] },
  {
    rule: 'kernel-imports-kernel-only',
    files: { 'shared/kernel/a.ts': "import type { Z } from 'zod';\nexport type A = Z;\n", ...packageFiles('zod') },
    folders: ['shared'],
  },
  {
    rule: 'contracts-import-zod-and-shared',
    files: { 'shared/contracts/a.ts': imports('react'), ...packageFiles('react') },
    folders: ['shared'],
  },
  {
    rule: 'src-never-imports-the-server',
    files: { 'src/a.ts': imports('../server/b.ts'), 'server/b.ts': '' },
    folders: ['src', 'server'],
  },
  {
    rule: 'src-never-imports-the-server',
    files: { 'src/a.ts': imports('drizzle-orm'), ...packageFiles('drizzle-orm') },
    folders: ['src'],
  },
  { rule: 'src-never-imports-node', files: { 'src/a.ts': imports('node:path') }, folders: ['src'] },
  {
    rule: 'server-never-imports-pages-or-tests',
    files: { 'server/a.ts': imports('../src/b.ts'), 'src/b.ts': '' },
    folders: ['src', 'server'],
  },
  {
    rule: 'ui-and-lib-never-import-features',
    files: { 'src/ui/a.ts': imports('../features/frame/b.ts'), 'src/features/frame/b.ts': '' },
    folders: ['src'],
  },
  {
    rule: 'features-never-import-the-app',
    files: { 'src/features/frame/a.ts': imports('../../app/b.ts'), 'src/app/b.ts': '' },
    folders: ['src'],
  },
  {
    rule: 'a-feature-never-imports-another',
    files: { 'src/features/frame/a.ts': imports('../jobs/b.ts'), 'src/features/jobs/b.ts': '' },
    folders: ['src'],
  },
  {
    rule: 'only-stores-touch-the-database',
    files: { 'server/features/jobs/jobs.service.ts': imports('drizzle-orm'), ...packageFiles('drizzle-orm') },
    folders: ['server'],
  },
  {
    rule: 'only-routes-touch-express',
    files: { 'server/features/jobs/jobs.service.ts': imports('express'), ...packageFiles('express') },
    folders: ['server'],
  },
  {
    rule: 'only-server-dxf-names-dxf-packages',
    files: { 'server/layer-set/a.ts': imports('dxf-writer'), ...packageFiles('dxf-writer') },
    folders: ['server'],
  },
  {
    rule: 'only-server-pdf-names-pdfkit',
    files: { 'server/layer-set/a.ts': imports('pdfkit'), ...packageFiles('pdfkit') },
    folders: ['server'],
  },
];
