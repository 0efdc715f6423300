import { bundleFile } from './bundle-file';
import type { BundleFile } from './bundle-input';

/** README.txt, the files, and SHA256SUMS of all of them as `sha256sum -c` reads it. */
export function withSums(readme: string, contents: BundleFile[]): Map<string, Uint8Array> {
  const files = [bundleFile('README.txt', '', readme), ...contents];
  const sums = files.map(({ path, sha256 }) => `${sha256}  ${path}\n`).join('');
  return new Map([
    ...files.map(({ path, bytes }): [string, Uint8Array] => [path, bytes]),
    ['SHA256SUMS', new TextEncoder().encode(sums)]
  ]);
}
