import type { ParamMatcher } from '@sveltejs/kit';

/** Lower case letters, digits and hyphens, 2 to 40; whether such a team exists is another question. */
export const match: ParamMatcher = (text) => /^[a-z0-9][a-z0-9-]{0,38}[a-z0-9]$/.test(text);
