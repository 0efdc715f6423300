import { generator } from '../random/generator';
import { shuffle } from '../random/shuffle';

const sites = 64;
const shots = 5000;
const rate = 0.2;
/** Neighbours, from 0. */
const pair = [20, 21];
/** Both excited, the first alone, the second alone: 1000 excitations each, and (240·5000 − 1000²)/(1000·4000) = 0.05. */
const table = [240, 760, 760];

/**
 * Invented: 5000 shots of 64 sites of rate 0.2, each by itself but for two neighbours. Their own table is fixed, so that
 * their measured correlation is 0.05 and not just that of the law behind it; which shots are which is drawn.
 */
export function oneCrosstalkingPair(): string {
  const random = generator(1, 0);
  const cells = Float64Array.from({ length: shots }, (_, shot) =>
    shot < table[0] ? 3 : shot < table[0] + table[1] ? 1 : shot < table[0] + table[1] + table[2] ? 2 : 0
  );
  shuffle(random, cells);
  const rows = Array.from(cells, (cell) =>
    Array.from({ length: sites }, (_, site) => {
      if (site === pair[0]) return cell & 1;
      if (site === pair[1]) return cell >> 1;
      return random.next() < rate ? 1 : 0;
    }).join('')
  );
  return `# Invented: 64 sites of a chain, 5000 shots; sites 21 and 22 have a measured correlation of 0.05.\n${rows.join('\n')}\n`;
}
