import { bundleContents, shotList } from './bundle-contents';
import { bundleReadme } from './bundle-readme';
import type { BundleInput } from './bundle-input';
import { withSums } from './with-sums';

/** A bundle: the folder that everything lies in, and its files by their path in it. */
export interface Bundle {
  folder: string;
  files: Map<string, Uint8Array>;
}

/**
 * Everything about a report, with a README that says how to compute it again from the command line, and SHA256SUMS.
 * Pure: the same input gives the same bytes. The folder is named for the document, so that two reports unpacked side by
 * side do not mix, and names nobody.
 */
export function bundleFiles(input: BundleInput): Bundle {
  const contents = bundleContents(input);
  const folder = `severalty-${contents[0].sha256.slice(0, 12)}`;
  const readme = bundleReadme(input, contents, { folder, hasShots: shotList(input) !== null });
  return { folder, files: withSums(readme, contents) };
}
