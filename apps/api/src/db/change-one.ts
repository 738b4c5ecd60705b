import type { Attributes, Model, ModelStatic, WhereOptions } from 'sequelize';

/**
 * A conditional update of one row: the row changes only while it still is as `where` says (its
 * id and what it must be, such as its status or `rowVersion`).
 * @returns false when no row was so: somebody was faster
 * @throws when more than one row was meant
 */
export async function changeOne<M extends Model>(
  model: ModelStatic<M>,
  values: Partial<Attributes<M>>,
  where: WhereOptions<Attributes<M>>,
): Promise<boolean> {
  const [changed] = await model.update(values, { where });
  if (changed > 1) throw new Error(`An update of one row of ${model.name} changed ${changed}.`);
  return changed === 1;
}
