import type { Coating } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';

/** What colour a coat is: the chosen tint, else the colour the food has by itself. */
export function coatColour(
  menu: Menu,
  coat: Pick<Coating, 'covering' | 'style' | 'colour'>,
): string {
  if (coat.colour !== null) return coat.colour;
  const style = menu.styles.find((it) => it.id === coat.style)?.colour;
  const covering = menu.coverings.find((it) => it.id === coat.covering)?.colour;
  const shows = coat.covering === 'buttercream' || coat.covering === 'semi-naked';
  return (shows ? style : covering) ?? covering ?? '#ffffff';
}
