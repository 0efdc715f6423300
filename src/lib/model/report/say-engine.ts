import { engineVersion } from '$lib/stats/engine-version';

/** That a document was made by another engine than this program's; '' when it was not. */
export const sayEngine = (version: string): string =>
  version === engineVersion
    ? ''
    : `Made by engine ${version}; this program runs ${engineVersion}. The result is shown as it was made. Computed again it may differ, and what engine ${version} did not write yet is shown as not known.`;
