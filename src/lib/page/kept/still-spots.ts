import { followed } from './followed';
import { SPOTS, type SpotName, type SpotProps } from './spots';
import { waken, type Maker, type Waking } from './waken';

/**
 * Sees to the spots in a page that the server drew: each is made live when it is wanted. One within another is the
 * other's to make.
 *
 * @param share what the page knows, by kind of spot; the rest stands in the markup
 */
export function stillSpots(
  place: HTMLElement,
  share: () => { [Spot in SpotName]?: Partial<SpotProps[Spot]> },
  context: Map<unknown, unknown>
): { name: SpotName; waking: Waking }[] {
  const outer = [...place.querySelectorAll<HTMLElement>('[data-spot]')].filter(
    (spot) => !spot.parentElement?.closest('[data-spot]')
  );
  return outer.map((spot) => {
    const name = spot.dataset.spot as SpotName;
    const given = JSON.parse(spot.dataset.given ?? '{}') as object;
    const props = followed(
      () => given,
      () => share()[name] ?? {}
    );
    return { name, waking: waken(spot, SPOTS[name] as Maker<typeof props>, props, context) };
  });
}
