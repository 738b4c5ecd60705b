import type { KitchenPiece } from '#shared/contracts/kitchen-sheet.ts';
import { gramsText } from '#web/lib/grams-text.ts';

type Props = { readonly pieces: readonly KitchenPiece[]; readonly locale: string };

/** Each tier and cutting cake with what goes on it and what is made for it. */
export function PieceWeights({ pieces, locale }: Props) {
  return (
    <table className="w-full max-w-3xl border-collapse print:text-sm">
      <caption className="sr-only">Weights by tier</caption>
      <thead>
        <tr className="border-b border-seam text-left text-sm text-slate">
          <th scope="col" className="py-1.5 pr-4 font-normal">
            Part
          </th>
          <th scope="col" className="py-1.5 pl-4 text-right font-normal">
            On the cake
          </th>
          <th scope="col" className="py-1.5 pl-4 text-right font-normal">
            To make
          </th>
        </tr>
      </thead>
      {pieces.map((piece, at) => (
        <tbody key={`${at} ${piece.name}`} className="break-inside-avoid">
          <tr>
            <th scope="rowgroup" colSpan={3} className="pt-3 pb-1 text-left font-semibold">
              {piece.name}
              {piece.count > 1 && (
                <span className="font-normal text-slate">, {piece.count} of them, each</span>
              )}
            </th>
          </tr>
          {piece.parts.map((part) => (
            <tr key={`${part.part} ${part.name}`} className="border-b border-seam">
              <th scope="row" className="py-1.5 pr-4 text-left font-normal print:py-0.5">
                {part.name}
              </th>
              <td className="py-1.5 pl-4 text-right whitespace-nowrap tabular-nums print:py-0.5">
                {gramsText(part.inCakeG, locale)}
              </td>
              <td className="py-1.5 pl-4 text-right whitespace-nowrap tabular-nums print:py-0.5">
                {gramsText(part.toMakeG, locale)}
                {part.part === 'sponge' && (
                  <span className="block text-sm text-slate print:ml-1 print:inline">batter</span>
                )}
              </td>
            </tr>
          ))}
          {piece.parts.length === 0 && (
            <tr className="border-b border-seam">
              <td colSpan={3} className="py-1.5 text-slate">
                Nothing is baked or spread for it.
              </td>
            </tr>
          )}
        </tbody>
      ))}
    </table>
  );
}
