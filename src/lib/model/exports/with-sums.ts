import type { BundleFile } from './bundle-input';
import { fileSha256 } from './file-sha256';

/** README.txt, the files, and SHA256SUMS of all of them as `sha256sum -c` reads it. */
export function withSums(readme: string, contents: BundleFile[]): Map<string, Uint8Array> {
  const files = new Map([
    ['README.txt', new TextEncoder().encode(readme)],
    ...contents.map(({ path, bytes }): [string, Uint8Array] => [path, bytes])
  ]);
  const sums = [...files].map(([path, bytes]) => `${fileSha256(bytes)}  ${path}\n`).join('');
  return files.set('SHA256SUMS', new TextEncoder().encode(sums));
}
