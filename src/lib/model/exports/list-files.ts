import type { BundleFile } from './bundle-input';
import { fileSha256 } from './file-sha256';

/** The files in words, each with its size and sha256. */
export const listFiles = (files: BundleFile[]): string =>
  files
    .map(
      ({ path, what, bytes }) => `${path}\n  ${what}\n  ${bytes.length} bytes, sha256 ${fileSha256(bytes)}`
    )
    .join('\n');
