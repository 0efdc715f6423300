import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { linesThatMatch, sourceFiles } from '../../support/source-files';

// Written in pieces, so that this file does not match itself.
const join = (...parts: string[]) => parts.join('');
const FOLDERS = join('(home|ro', 'ot|Us', 'ers|wo', 'rk|tm', 'p|opt|mnt|var|us', 'r)');
const MACHINE_PATH = new RegExp(`(^|["'\`\\s(=:])/${FOLDERS}/\\w`);
const REGISTRY = new RegExp(join('https?://[\\w.-]*(regis', 'try|npm', 'js|py', 'pi|deb', 'ian)\\b'), 'i');
const LEFT_OVER = new RegExp(
  join(
    '\\b(TO',
    'DO|FIX',
    'ME|XX',
    'X)\\b|\\b(it|test|describe)\\.(on',
    'ly|sk',
    'ip|to',
    'do)\\(|@ts-ig',
    'nore|\\bas an',
    'y\\b'
  )
);
const files = sourceFiles();

describe('what must not be left in a file', () => {
  it('finds the project', () => {
    const paths = new Set(files.map(({ path }) => path));
    const expected = ['package.json', 'src/hooks.server.ts', '.ci/run', 'README.md', 'DEVELOPERS.md'];
    expect(expected.filter((path) => !paths.has(path))).toEqual([]);
  });

  it('paths of one machine', () => {
    // The first line of a script names its interpreter.
    const found = linesThatMatch(files, MACHINE_PATH).filter((line) => !/:1: #!/.test(line));
    expect(found).toEqual([]);
  });

  it('hosts of package registries', () => {
    expect(linesThatMatch(files, REGISTRY)).toEqual([]);
    const lockfile = sourceFilesOf('package-lock.json');
    expect(linesThatMatch(lockfile, /"resolved"/)).toEqual([]);
  });

  it('marks of unfinished work', () => {
    expect(linesThatMatch(files, LEFT_OVER)).toEqual([]);
  });

  it('would be found', () => {
    const planted = [
      `const a = "${join('/ho', 'me/someone/x')}";`,
      `fetch("${join('https://regis', 'try.example.org/x')}")`,
      join('it.on', 'ly("x", () => {})')
    ];
    expect(MACHINE_PATH.test(planted[0])).toBe(true);
    expect(REGISTRY.test(planted[1])).toBe(true);
    expect(LEFT_OVER.test(planted[2])).toBe(true);
  });
});

describe('the environment', () => {
  it('is read in one place', () => {
    const readers = linesThatMatch(sourceFiles(['src']), /process\.env\b(?!\.\w+ = )/)
      .map((line) => line.slice(0, line.indexOf(':')))
      // prepare runs before anything is installed, and hands the environment on to npm and Vite.
      .filter((path) => !path.startsWith('src/cli/prepare/'));
    expect([...new Set(readers)]).toEqual(['src/lib/server/env.ts']);
  });
});

function sourceFilesOf(path: string) {
  return [{ path, text: readFileSync(path, 'utf8') }];
}
