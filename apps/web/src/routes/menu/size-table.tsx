import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { portionsOfBlock, portionsOfSheet } from '#shared/kitchen/sizes.ts';

/** How many each size feeds, by the studio's cutting plan, for each portion it offers. */
export function SizeTable({ menu }: { readonly menu: Menu }) {
  const lead = menu.studio.lengthLead;
  const rounds = menu.tierSizes.filter((it) => it.shape === 'round');
  const rows = [
    ...rounds.map((size) => ({
      key: `round-${size.widthMm}`,
      name: formatLength(size.widthMm, lead),
      counts: menu.portionSizes.map((it) =>
        portionsOfBlock({ ...size, heightMm: size.heightsMm[0] ?? 100 }, it, menu.kitchen),
      ),
    })),
    ...menu.sheetSizes.map((size) => ({
      key: size.id,
      name: size.name,
      counts: menu.portionSizes.map((it) => portionsOfSheet(size, it)),
    })),
  ];
  return (
    <table className="w-full border-collapse tabular-nums">
      <caption className="sr-only">Portions by size of cake and size of portion</caption>
      <thead>
        <tr className="border-b-2 border-cobalt text-left align-bottom">
          <th scope="col" className="py-2 pr-2 sm:pr-4 font-semibold">
            A tier or sheet of
          </th>
          {menu.portionSizes.map((it) => (
            <th key={it.id} scope="col" className="py-2 pl-2 sm:pl-4 text-right font-semibold">
              {it.name}
              <span className="block text-sm font-normal text-slate">
                {formatLength(it.widthMm, lead)} × {formatLength(it.depthMm, lead)}
              </span>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.key} className="border-b border-seam">
            <th scope="row" className="py-2.5 pr-2 sm:pr-4 text-left font-medium">
              {row.name}
            </th>
            {row.counts.map((count, at) => (
              <td key={menu.portionSizes[at]?.id ?? at} className="py-2.5 pl-2 sm:pl-4 text-right">
                {count}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
