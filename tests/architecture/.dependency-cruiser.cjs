/** Who may import whom. Each rule is shown able to fail in import-direction.test.ts. */

const packages = (...names) => `(^|/)node_modules/(${names.join('|')})/`;

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'everything-resolves', severity: 'error', from: {}, to: { couldNotResolve: true } },
    {
      name: 'kernel-imports-kernel-only',
      comment: 'The kernel runs the same in the browser, on the server and on the command line.',
      severity: 'error',
      from: { path: '^shared/kernel/' },
      to: { pathNot: '^shared/kernel/' },
    },
    {
      name: 'contracts-import-zod-and-shared',
      severity: 'error',
      from: { path: '^shared/contracts/' },
      to: { pathNot: ['^shared/', packages('zod')] },
    },
    {
      name: 'src-never-imports-the-server',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: ['^(server|drizzle|tests)/', packages('express', 'drizzle-orm', 'pg', '@electric-sql')] },
    },
    {
      name: 'src-never-imports-node',
      severity: 'error',
      from: { path: '^src/' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'server-never-imports-pages-or-tests',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^(src|tests)/' },
    },
    {
      name: 'ui-and-lib-never-import-features',
      severity: 'error',
      from: { path: '^src/(ui|lib)/' },
      to: { path: '^src/(features|app)/' },
    },
    {
      name: 'features-never-import-the-app',
      severity: 'error',
      from: { path: '^src/features/' },
      to: { path: '^src/app/' },
    },
    {
      name: 'a-feature-never-imports-another',
      comment: 'Routes put features together.',
      severity: 'error',
      from: { path: '^src/features/([^/]+)/' },
      to: { path: '^src/features/', pathNot: '^src/features/$1/' },
    },
    {
      name: 'only-stores-touch-the-database',
      severity: 'error',
      from: { path: '^server/', pathNot: ['\\.store\\.ts$', '^server/db/'] },
      to: { path: packages('drizzle-orm', 'pg', '@electric-sql') },
    },
    {
      name: 'only-routes-touch-express',
      severity: 'error',
      from: { path: '^server/', pathNot: ['\\.routes\\.ts$', '^server/http/', '^server/app\\.ts$'] },
      to: { path: packages('express', 'express-session', 'express-rate-limit', 'helmet', 'multer', 'compression') },
    },
    {
      name: 'only-server-dxf-names-dxf-packages',
      severity: 'error',
      from: { path: '^(src|server|shared)/', pathNot: '^server/dxf/' },
      to: { path: packages('dxf-writer', 'dxf-parser') },
    },
    {
      name: 'only-server-pdf-names-pdfkit',
      severity: 'error',
      from: { path: '^(src|server|shared)/', pathNot: '^server/pdf/' },
      to: { path: packages('pdfkit', 'woff2-encoder') },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'node', 'default'],
      extensions: ['.ts', '.tsx', '.js'],
    },
  },
};
