import type { BundleFile } from './bundle-input';

/** The files in words, each with its size and sha256. */
export const listFiles = (files: BundleFile[]): string =>
  files
    .map(({ path, what, bytes, sha256 }) => `${path}\n  ${what}\n  ${bytes.length} bytes, sha256 ${sha256}`)
    .join('\n');
