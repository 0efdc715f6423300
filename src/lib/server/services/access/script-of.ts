import type { Actor } from './actor';

/** What an event keeps of the script that acted: the name of its token; nothing when a person acted themselves. */
export const scriptOf = ({ token }: Actor): { script?: string } => (token ? { script: token.name } : {});
