// Apart from the schemas, which a page with a field for a remark need not load.

/** Longest remark, in characters: a page of text. */
export const REMARK_LENGTH = 4000;
/** Longest name a remark is signed with. */
export const NAME_LENGTH = 80;
