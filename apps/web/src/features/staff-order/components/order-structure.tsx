import type { Cake } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { formatList } from '#shared/dates/format.ts';
import { formatLength, formatWeight } from '#shared/kitchen/measures.ts';
import { pieceName } from '#shared/kitchen/piece-name.ts';
import { blockOfSheet } from '#shared/kitchen/sizes.ts';
import { supportRows } from '#shared/kitchen/support-words.ts';
import { tinsOf } from '#shared/kitchen/tins.ts';
import { DataList, type DataRow } from '#web/components/ui/data-list.tsx';

type Props = { readonly order: StaffOrder; readonly menu: Menu };

/** What it is baked in, what holds it up and what each piece weighs: for baking, stacking, boxing. */
export function OrderStructure({ order, menu }: Props) {
  const { cake } = order.design;
  if (cake === null) return null;
  const lead = menu.studio.lengthLead;
  const known = sheetsAreKnown(cake, menu);
  const weights = order.estimate.pieces.map((it): DataRow => {
    const each = it.count === 1 ? '' : `${it.count} × `;
    return {
      key: `${it.kind} ${it.index}`,
      label: pieceName(it, cake, menu),
      value: `${each}${formatWeight(it.weightG, lead)}`,
    };
  });
  const whole: DataRow = {
    key: 'whole',
    label: 'Whole, on its board',
    value: `${formatWeight(order.estimate.weightG, lead)}, ${formatLength(order.estimate.heightMm, lead)} high`,
  };
  const supports = known ? supportRows(cake, menu) : [];
  const tins = known ? tinRows(cake, menu) : [];
  return (
    <div className="grid gap-6">
      {order.estimate.weightG > 0 && (
        <div className="grid gap-1">
          <h3>To carry</h3>
          <DataList rows={[...topDown(weights), whole, ...apart(weights)]} />
        </div>
      )}
      {supports.length > 0 && (
        <div className="grid gap-1">
          <h3>Boards and dowels</h3>
          <DataList
            rows={supports.toReversed().map(({ name, lines }) => ({
              key: name,
              label: name,
              value: lines.join(' '),
            }))}
          />
          {supports.some((it) => it.lines.length > 0 && it.name !== 'Cake board') && (
            <p className="measure text-sm text-slate">
              Count them into the cake before boxing; the care card tells the customer how many come
              out before eating.
            </p>
          )}
        </div>
      )}
      {tins.length > 0 && (
        <div className="grid gap-1">
          <h3>Tins and batter</h3>
          <DataList rows={[...topDown(tins), ...apart(tins)]} />
        </div>
      )}
    </div>
  );
}

const isApart = (row: DataRow): boolean => row.key.startsWith('cutting-cake');

/** The cake on show as it stands in its drawing. */
const topDown = (rows: readonly DataRow[]): DataRow[] =>
  rows.filter((it) => !isApart(it)).toReversed();

const apart = (rows: readonly DataRow[]): DataRow[] => rows.filter(isApart);

function sheetsAreKnown(cake: Cake, menu: Menu): boolean {
  if (cake.kind === 'tiered') return true;
  return menu.sheetSizes.some((it) => it.id === cake.sheet?.sizeId);
}

/** A row for each body whose sponge is still on the menu. */
function tinRows(cake: Cake, menu: Menu): DataRow[] {
  const lead = menu.studio.lengthLead;
  const sheetOf = (sizeId: string) => menu.sheetSizes.find((it) => it.id === sizeId);
  const bodies = [
    ...cake.tiers.map((tier, index) => ({
      at: { kind: 'tier' as const, index },
      count: 1,
      block: tier,
      ...tier,
    })),
    ...[
      ...(cake.kind === 'sheet' && cake.sheet !== null
        ? [{ at: { kind: 'sheet' as const, index: 0 }, count: 1, ...cake.sheet }]
        : []),
      ...cake.cuttingCakes.map((it, index) => ({
        at: { kind: 'cutting-cake' as const, index },
        ...it,
      })),
    ].flatMap((it) => {
      const size = sheetOf(it.sizeId);
      return size === undefined ? [] : [{ ...it, real: true, block: blockOfSheet(size) }];
    }),
  ];
  return bodies.flatMap(({ at, count, block, layers, real, spongeId, fillingId }): DataRow[] => {
    const tins = tinsOf(
      {
        block,
        layers,
        real,
        sponge: menu.sponges.find((it) => it.id === spongeId) ?? null,
        filling: menu.fillings.find((it) => it.id === fillingId) ?? null,
      },
      menu.kitchen,
    );
    if (tins === null) return [];
    const grams = [...new Set(tins.batterG.map((it) => formatWeight(it, lead)))];
    const times = count === 1 ? '' : `${count} × `;
    const layersEach = tins.layersEach === 2 ? ', two layers to a tin' : '';
    const across =
      block.widthMm === block.depthMm
        ? formatLength(block.widthMm, lead)
        : `${formatLength(block.widthMm, lead)} by ${formatLength(block.depthMm, lead)}`;
    return [
      {
        key: `${at.kind} ${at.index}`,
        label: pieceName(at, cake, menu),
        value: `${times}${tins.count} ${tins.count === 1 ? 'tin' : 'tins'} of ${across}, ${formatLength(tins.depthMm, lead)} deep${layersEach}: ${formatList(grams)} of batter, standing ${formatLength(tins.fillMm.least, lead)} to ${formatLength(tins.fillMm.most, lead)} high.`,
      },
    ];
  });
}
