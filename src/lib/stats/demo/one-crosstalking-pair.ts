import { generator } from '../random/generator';
import { shuffle } from '../random/shuffle';

const sites = 64;
const shots = 5000;
const rate = 0.2;
/** Neighbours, from 0. */
const pair = [20, 21];
/** Excitations of each of the two. */
const each = 1000;

/**
 * Invented: 5000 shots of 64 sites of rate 0.2, each by itself but for two neighbours. Their own table is fixed, so that
 * their measured correlation is 0.05 and not just that of the law behind it; which shots are which is drawn.
 *
 * @param together shots with both excited: (240·5000 − 1000²)/(1000·4000) = 0.05; with 200 they are as without crosstalk
 */
export function oneCrosstalkingPair(together = 240, seed = 1): string {
  const random = generator(seed, 0);
  const cells = Float64Array.from({ length: shots }, (_, shot) =>
    shot < together ? 3 : shot < each ? 1 : shot < 2 * each - together ? 2 : 0
  );
  shuffle(random, cells);
  const rows = Array.from(cells, (cell) =>
    Array.from({ length: sites }, (_, site) => {
      if (site === pair[0]) return cell & 1;
      if (site === pair[1]) return cell >> 1;
      return random.next() < rate ? 1 : 0;
    }).join('')
  );
  const correlation = (together * shots - each * each) / (each * (shots - each));
  return `# Invented: 64 sites of a chain, 5000 shots; sites 21 and 22 have a measured correlation of ${correlation}.\n${rows.join('\n')}\n`;
}
