import type { BundleFile } from './bundle-input';
import { fileSha256 } from './file-sha256';

/** A file with its sum, which README.txt and SHA256SUMS both tell: taken once, since a list of shots may be large. */
export function bundleFile(path: string, what: string, content: string | Uint8Array): BundleFile {
  const bytes = typeof content === 'string' ? new TextEncoder().encode(content) : content;
  return { path, what, bytes, sha256: fileSha256(bytes) };
}
