import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, resolve } from 'node:path';
import { findWords } from './find-words';

/**
 * Texts for people stand in words.ts or in a folder words/ (DEVELOPERS.md). Looks where biome.json turns `noJsxLiterals` on;
 * prints each text that stands elsewhere and exits 1.
 */
const WORDS_MAY_STAND = [
  /\.test\.tsx?$/,
  // Made ground for tests, and what the demo club is called and has written down.
  /\/example-[\w-]+\.ts$/,
  /^src\/features\/demo\/[\w-]+\.ts$/,
  /(^|\/)words\.ts$/,
  /\/words\/[\w-]+\.ts$/,
  // Numbers, units and dates are formatted in one place each; the source of a constant stands beside it.
  /^src\/core\/(units|day-time|settings|setting-notes)\.ts$/,
  // Settings are refused to whoever starts the program, by the names they have in .env.
  /^src\/env\.ts$/,
  // Made services answer our programs in the real ones' words; a worker's code is kept as text.
  /^src\/adapters\/(\w+\/fake\/[\w-]+|solver\/worker-code)\.ts$/,
  // Names of columns as other programs write them, and markup.
  /^src\/features\/exchange\/(read\/read-csv|write\/write-gpx)\.ts$/,
];

interface Override {
  includes: string[];
  linter?: { rules?: { style?: Record<string, unknown> } };
}

const root = resolve(import.meta.dirname, '..');
const { overrides }: { overrides: Override[] } = JSON.parse(readFileSync(join(root, 'biome.json'), 'utf8'));
const globs = overrides.filter((o) => o.linter?.rules?.style?.noJsxLiterals).flatMap((o) => o.includes);

/** `*` within one name, `**` over any. */
const matches = (path: string, glob: string) =>
  new RegExp(
    `^${glob
      .replace(/[.()[\]]/g, '\\$&')
      .replaceAll('**', '\0')
      .replaceAll('*', '[^/]*')
      .replaceAll('\0', '.*')}$`,
  ).test(path);

const isChecked = (path: string) =>
  globs.some((glob) => !glob.startsWith('!') && matches(path, glob)) &&
  !globs.some((glob) => glob.startsWith('!') && matches(path, glob.slice(1))) &&
  !WORDS_MAY_STAND.some((pattern) => pattern.test(path));

const problems = readdirSync(join(root, 'src'), { recursive: true, withFileTypes: true })
  .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
  .map((entry) => relative(root, join(entry.parentPath, entry.name)))
  .filter(isChecked)
  .flatMap((path) =>
    findWords(path, readFileSync(join(root, path), 'utf8')).map(({ line, text }) => `${path}:${line}  ${text}`),
  );

if (problems.length > 0) {
  console.error(problems.join('\n'));
  console.error(`${problems.length} texts stand outside the words of their feature.`);
  process.exit(1);
}
console.log('The texts stand in their words.');
