import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

export interface SourceFile {
  /** Relative to the project folder, with forward slashes. */
  path: string;
  text: string;
}

const TEXT = /\.(ts|mjs|cjs|js|svelte|css|html|json|py|R|md|sh)$|(^|\/)run$/;
const GENERATED = /^(node_modules|build|build-cli|build-worker|\.svelte-kit|\.git|data|coverage)$/;

/**
 * Every text file that people write, in name order: the folders named, or the whole project.
 * Walked and not asked of git, so that it holds for an unpacked archive too.
 */
export function sourceFiles(folders: string[] = ['']): SourceFile[] {
  const list: SourceFile[] = [];
  const visit = (folder: string) => {
    for (const entry of readdirSync(folder || '.', { withFileTypes: true })) {
      const path = folder ? `${folder}/${entry.name}` : entry.name;
      if (GENERATED.test(path)) continue;
      if (entry.isDirectory()) visit(path);
      else if (TEXT.test(path) && path !== 'package-lock.json') {
        list.push({ path, text: readFileSync(join(folder || '.', entry.name), 'utf8') });
      }
    }
  };
  for (const folder of folders) visit(folder);
  return list.sort((a, b) => (a.path < b.path ? -1 : 1));
}

/** `path:line: text` for every line that matches. */
export function linesThatMatch(files: SourceFile[], pattern: RegExp): string[] {
  return files.flatMap(({ path, text }) =>
    text
      .split('\n')
      .flatMap((line, i) => (pattern.test(line) ? [`${path}:${i + 1}: ${line.trim().slice(0, 120)}`] : []))
  );
}
