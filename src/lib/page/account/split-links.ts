/** A piece of a letter: plain text, or an address that it names. */
export interface Piece {
  text: string;
  link: boolean;
}

/** A letter cut at the addresses in it, so that they can be followed. */
export function splitLinks(text: string): Piece[] {
  return text
    .split(/(https?:\/\/[^\s<>"]+)/)
    .map((piece, index) => ({ text: piece, link: index % 2 === 1 }))
    .filter(({ text }) => text !== '');
}
