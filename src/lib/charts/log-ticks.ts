import type { ScaleLogarithmic } from 'd3-scale';
import type { Tick } from './picture';
import { powerTick } from './power-tick';

/**
 * Ticks of a logarithmic axis: powers of ten, with 2 and 5 between them where there are fewer than three.
 *
 * @param apart least distance between two ticks, picture units
 */
export function logTicks(scale: ScaleLogarithmic<number, number>, apart: number): Tick[] {
  const [low, high] = scale.domain();
  const first = Math.floor(Math.log10(low));
  const last = Math.ceil(Math.log10(high));
  const powers = Array.from({ length: last - first + 1 }, (_, i) => first + i);
  const inside = (value: number) => value >= low && value <= high;
  const tens = powers.filter((power) => inside(10 ** power));
  const fine = tens.length < 3;
  const ticks = fine
    ? powers.flatMap((power) =>
        [1, 2, 5].flatMap((lead) => {
          const value = Number(`${lead}e${power}`);
          return inside(value) ? [{ at: scale(value), ...named(lead, power) }] : [];
        })
      )
    : tens.map((power) => ({ at: scale(10 ** power), ...powerTick(power) }));
  let kept = -Infinity;
  const roomy = ticks.filter(({ at }) => {
    const place = Math.abs(at - ticks[0].at);
    if (place - kept < apart) return false;
    kept = place;
    return true;
  });
  return roomy;
}

const named = (lead: number, power: number): Omit<Tick, 'at'> =>
  lead === 1 ? powerTick(power) : { text: String(Number(`${lead}e${power}`)) };
