/**
 * Typed text that stays text in Markdown: every sign that can begin markup, a link, a formula or HTML stands behind a
 * backslash (CommonMark 0.31, section 2.4: any ASCII punctuation may). A point is escaped inside a word alone, where
 * it could make an address; at the start of a line, where "-" and "1." begin lists, no name stands.
 */
export const escapeMarkdown = (text: string): string =>
  text.replace(/[\\`*_{}[\]()<>#&~|$!+=:@^"]|\.(?=\S)/g, '\\$&');
