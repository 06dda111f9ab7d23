import { isCode, isProductCode, type SourceFile } from './source-files.ts';

/** A rule that can be seen in the text of one file. */
export interface TextRule {
  readonly name: string;
  readonly applies: (path: string) => boolean;
  /** What breaks the rule; empty when nothing does. */
  readonly find: (file: SourceFile) => string[];
  /** A file that breaks it, to show that the rule can fail. */
  readonly breaker: SourceFile;
}

// Breakers and patterns are put together from pieces, so that this file does not break its own rules.
const join = (...pieces: string[]) => pieces.join('');

const matches =
  (pattern: RegExp) =>
  ({ text }: SourceFile): string[] =>
    text.split('\n').flatMap((line, i) => (pattern.test(line) ? [`${i + 1}: ${line.trim().slice(0, 100)}`] : []));

/** The same lines without what stands in comments; a string that holds two slashes loses its end, which breaks no rule. */
const withoutComments = (file: SourceFile): SourceFile => ({
  ...file,
  text: file.text
    .replace(/\/\*[\s\S]*?\*\//g, (comment) => comment.replace(/[^\n]/g, ''))
    .replace(/(?<!:)\/\/.*$/gm, ''),
});

const inCode = (pattern: RegExp) => (file: SourceFile) => matches(pattern)(withoutComments(file));

const LONGEST_FILE = 400;

export const TEXT_RULES: readonly TextRule[] = [
  {
    name: `no file of code is longer than ${LONGEST_FILE} lines`,
    applies: (path) => isCode(path) || path.endsWith('.css'),
    find: ({ text }) => (text.trimEnd().split('\n').length > LONGEST_FILE ? [`${text.split('\n').length} lines`] : []),
    breaker: { path: 'src/a.ts', text: 'const a = 1;\n'.repeat(LONGEST_FILE + 1) },
  },
  {
    name: 'no file names a place on one machine',
    applies: () => true,
    find: matches(/(?<![\w.])\/(work|root|home|Users|tmp)\/\w/),
    breaker: { path: 'server/a.ts', text: join("const folder = '/ho", "me/anna/frames';") },
  },
  {
    name: 'no file names a package registry',
    applies: () => true,
    find: matches(new RegExp(join('registry\\.(npm', 'js|yarnpkg)|"res', 'olved"|^\\s*registry\\s*=|pypi\\.', 'org'))),
    breaker: { path: 'package-lock.json', text: join('"res', 'olved": "https://example.com/a.tgz"') },
  },
  {
    name: 'no test is skipped, set apart or left to do',
    applies: (path) => path.startsWith('tests/') && isCode(path),
    find: matches(
      /\b(test|it|describe)(\.\w+)*\.(skip|only|todo|fixme|fails|skipIf|runIf)\b|\b(xit|xtest|xdescribe|fit|fdescribe)\(/,
    ),
    breaker: { path: 'tests/shared/a.test.ts', text: join('test.sk', "ip('reads', () => {});") },
  },
  {
    name: 'colours are written in the tokens only',
    applies: (path) =>
      /^(src|server|shared)\//.test(path) &&
      /\.(ts|tsx|css)$/.test(path) &&
      !/sheet\/(sheet-colours|aci-hex)\.ts$/.test(path),
    // A custom property of a style sheet is a token.
    find: matches(/^(?!\s*--[\w-]+:).*(#([0-9a-f]{3,4}|[0-9a-f]{6}|[0-9a-f]{8})\b(?!\/)|\b(rgb|hsl|oklch)a?\(\s*\d)/i),
    breaker: { path: 'src/ui/field.tsx', text: join("const ink = '#22", "282b';") },
  },
  {
    name: 'tolerances are named, in one file, or in one of their own folder',
    applies: (path) =>
      /^(shared\/kernel|server)\//.test(path) && !/^shared\/kernel\/(.+\/[a-z]+-)?tolerances\.ts$/.test(path),
    find: inCode(/(?<![\w.])\d(\.\d+)?e-\d+/i),
    breaker: { path: 'shared/kernel/contour/a.ts', text: join('const near = distance < 1e', '-6;') },
  },
  {
    name: 'the kernel knows no page, no machine, no clock and no chance',
    applies: (path) => path.startsWith('shared/kernel/'),
    find: inCode(
      /(?<![\w.])(document|process|globalThis|console|localStorage)\.|\bDate\.now\b|\bnew Date\(\)|\bMath\.random\b|\bfetch\(/,
    ),
    breaker: { path: 'shared/kernel/a.ts', text: 'const today = new Date();' },
  },
  {
    name: 'files are named in kebab-case, with no barrels',
    applies: isProductCode,
    find: ({ path }) =>
      /\/(?!index\.)[a-z0-9]+(-[a-z0-9]+)*(\.(routes|service|store|d))?\.tsx?$/.test(path) ? [] : [path],
    breaker: { path: 'src/ui/index.ts', text: '' },
  },
  {
    name: 'imports of our own files carry the extension',
    applies: (path) => /\.(ts|tsx)$/.test(path),
    find: matches(/\b(from|import\()\s*'(\.{1,2}\/|#shared\/)[^']*(?<!\.(ts|tsx|js|cjs|css|json|svg|woff2))'/),
    breaker: { path: 'src/a.ts', text: join('import { b } fr', "om './b';") },
  },
];
