import type { BatchSource } from '#shared/dates/model.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { Covering } from '#api/db/models/covering.ts';
import { Filling } from '#api/db/models/filling.ts';
import { FormulaLine } from '#api/db/models/formula-line.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';
import { Sponge } from '#api/db/models/sponge.ts';

/** The formula version a batch for a part of the menu is made by now; null where there is none. */
export async function formulaVersionOf({ part, id }: BatchSource): Promise<string | null> {
  if (part === 'custard') return custardInside(await formulaVersionOf({ part: 'style', id }));
  const row = await findPart(part, id);
  const formulaId = row?.formulaId ?? null;
  if (formulaId === null) return null;
  return (await Formula.findByPk(formulaId))?.currentVersionId ?? null;
}

function findPart(part: Exclude<BatchSource['part'], 'custard'>, id: string) {
  switch (part) {
    case 'sponge':
      return Sponge.findByPk(id);
    case 'filling':
      return Filling.findByPk(id);
    case 'style':
      return ButtercreamStyle.findByPk(id);
    case 'covering':
      return Covering.findByPk(id);
  }
}

/** The formula inside a buttercream that is a custard. */
async function custardInside(versionId: string | null): Promise<string | null> {
  if (versionId === null) return null;
  const lines = await FormulaLine.findAll({ where: { versionId } });
  for (const { formulaVersionId } of lines) {
    if (formulaVersionId === null) continue;
    const version = await FormulaVersion.findByPk(formulaVersionId, { include: ['formula'] });
    if (version?.formula?.kind === 'custard') return version.id;
  }
  return null;
}
