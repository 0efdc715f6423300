/** Bits set in both columns: shots on which both sites were excited; one column against itself gives its own sum. */
export function countTogether(a: Uint32Array, b: Uint32Array): number {
  let together = 0;
  for (let word = 0; word < a.length; word++) {
    // Bits summed in pairs, fours and bytes; the product adds the four bytes (Warren 2013, Hacker's Delight, 5-1).
    let bits = a[word] & b[word];
    bits -= (bits >>> 1) & 0x55555555;
    bits = (bits & 0x33333333) + ((bits >>> 2) & 0x33333333);
    together += Math.imul((bits + (bits >>> 4)) & 0x0f0f0f0f, 0x01010101) >>> 24;
  }
  return together;
}
