/**
 * Stands in for the unpacker of WOFF2 within the font reader, whose dictionary is half of all the code a PDF loads.
 * Fonts come here as TrueType (`woff-to-sfnt.ts`).
 */
export default function decompress(): never {
  throw new Error('WOFF2 fonts are not read here.');
}
