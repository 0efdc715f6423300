/**
 * The shots turned: one row of 32-bit words a site, in which shot s is bit s mod 32 of word ⌊s/32⌋, so that pairs of
 * sites are counted 32 shots at a time.
 *
 * @param shots packed rows: site i is bit i mod 8, lowest first, of byte ⌊i/8⌋
 */
export function siteColumns(shots: Uint8Array[], sites: number): Uint32Array[] {
  const columns = Array.from({ length: sites }, () => new Uint32Array(Math.ceil(shots.length / 32)));
  for (const [shot, row] of shots.entries()) {
    for (let site = 0; site < sites; site++) {
      if ((row[site >> 3] >> (site & 7)) & 1) columns[site][shot >> 5] |= 1 << (shot & 31);
    }
  }
  return columns;
}
