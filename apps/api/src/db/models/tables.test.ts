import { QueryTypes } from 'sequelize';
import type { ModelStatic, Model } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { pendingMigrations } from '../migrate.ts';
import { inTransaction } from '../transaction.ts';
import { Audit } from './audit.ts';
import { Formula } from './formula.ts';
import { FormulaLine } from './formula-line.ts';
import { FormulaVersion } from './formula-version.ts';
import { Ingredient } from './ingredient.ts';
import { PolicyVersion } from './policy-version.ts';
import { Studio } from './studio.ts';
import { User } from './user.ts';

let test: TestDatabase;
beforeAll(async () => {
  test = await openTestDatabase();
});
afterAll(() => test.close());

const select = <Row extends object>(sql: string, values = {}): Promise<Row[]> =>
  test.database.sequelize.query<Row>(sql, { type: QueryTypes.SELECT, replacements: values });

/** Words of a CHECK (column IN (...)) by column. */
function wordsByColumn(sql: string): Map<string, string[]> {
  const found = new Map<string, string[]>();
  for (const [, column = '', list = ''] of sql.matchAll(/\bCHECK \((\w+) IN \(([^)]*'[^)]*)\)/g)) {
    found.set(column, [...list.matchAll(/'([^']*)'/g)].map(([, word = '']) => word).sort());
  }
  return found;
}

function wordsByField(model: ModelStatic<Model>): Map<string, string[]> {
  const found = new Map<string, string[]>();
  for (const { field, validate } of Object.values(model.getAttributes())) {
    const words: unknown = validate?.['isIn'];
    if (field && Array.isArray(words)) found.set(field, words.flat().map(String).sort());
  }
  return found;
}

async function referring(table: string): Promise<string[]> {
  const keys = await select<{ column: string }>(
    'SELECT "from" AS column FROM pragma_foreign_key_list(:table)',
    { table },
  );
  return keys.map(({ column }) => column);
}

describe('the models', () => {
  it('are the tables of the migrations, column by column', async () => {
    const tables = await select<{ name: string; sql: string }>(
      `SELECT name, sql FROM sqlite_schema WHERE type = 'table'
       AND name NOT LIKE 'sqlite_%' AND name <> 'schema_migrations' ORDER BY name`,
    );
    const models = Object.values(test.database.sequelize.models);
    const modelOf = new Map(models.map((model) => [model.tableName, model]));
    expect([...modelOf.keys()].sort()).toEqual(tables.map(({ name }) => name));

    for (const { name, sql } of tables) {
      const columns = await select<{ name: string; notnull: number; pk: number }>(
        'SELECT name, "notnull", pk FROM pragma_table_info(:name)',
        { name },
      );
      const model = modelOf.get(name);
      const attributes = Object.values(model?.getAttributes() ?? {});
      expect(
        attributes
          .map(({ field, allowNull, primaryKey }) => ({
            name: field,
            nullable: allowNull === true,
            key: primaryKey === true,
          }))
          .sort((a, b) => String(a.name).localeCompare(String(b.name))),
        name,
      ).toEqual(
        columns
          .map((column) => ({
            name: column.name,
            nullable: column.notnull === 0 && column.pk === 0,
            key: column.pk > 0,
          }))
          .sort((a, b) => a.name.localeCompare(b.name)),
      );
      const words = model ? wordsByField(model) : new Map<string, string[]>();
      // A column that names a row of a closed catalogue is held by its foreign key.
      for (const column of await referring(name)) words.delete(column);
      expect(words, name).toEqual(wordsByColumn(sql));
      expect(sql, name).toMatch(/\) STRICT/);
    }
  });

  it('have an index on every foreign key', async () => {
    const missing = await select<{ tbl: string; col: string }>(
      `SELECT m.name AS tbl, f."from" AS col
       FROM sqlite_schema AS m, pragma_foreign_key_list(m.name) AS f
       WHERE m.type = 'table' AND NOT EXISTS (
         SELECT 1 FROM pragma_index_list(m.name) AS i, pragma_index_info(i.name) AS c
         WHERE c.seqno = 0 AND c.name = f."from"
       )`,
    );
    expect(missing).toEqual([]);
  });

  it('are all there as soon as the migrations have run', async () => {
    expect(await pendingMigrations()).toEqual([]);
  });
});

describe('kept values', () => {
  it('come back as they were written', async () => {
    const made = await inTransaction(() =>
      User.create({ email: 'ada@example.com', name: 'Ada', role: 'baker' }),
    );
    const read = await User.findByPk(made.id, { rejectOnEmpty: true });
    expect(read.createdAt).toEqual(test.clock.now());
    expect(read.endedAt).toBeNull();
    expect(made.endedAt).toBeNull();
  });

  it('are refused by the model when they are not of the type or list', async () => {
    const at = test.clock.now();
    const wrongWord = { email: 'b@example.com', name: 'B', role: 'chef' };
    await expect(
      // @ts-expect-error not a role
      inTransaction(() => User.create(wrongWord)),
    ).rejects.toThrow('Validation isIn on role failed');
    await expect(
      inTransaction(() =>
        Audit.create({
          actorKind: 'owner',
          action: 'look',
          subjectKind: 'order',
          subjectId: '1',
          // @ts-expect-error facts are flat
          data: { who: { name: 'Ada' } },
          at,
        }),
      ),
    ).rejects.toThrow();
    expect(await Audit.count()).toBe(0);
  });

  it('are refused by SQLite when they come another way', async () => {
    const insert = (columns: string, values: string): Promise<unknown> =>
      inTransaction(() =>
        test.database.sequelize.query(`INSERT INTO users (${columns}) VALUES (${values})`),
      );
    const columns = 'id, email, name, role, created_at';
    const instant = "'2026-05-04 10:00:00.000 +00:00'";
    await expect(insert(columns, `'x', 'x@y.z', 'X', 'chef', ${instant}`)).rejects.toThrow();
    await expect(insert(columns, `'x', 'X@y.z', 'X', 'owner', ${instant}`)).rejects.toThrow();
    await expect(
      insert(columns, `'x', 'x@y.z', 'X', 'owner', CURRENT_TIMESTAMP`),
    ).rejects.toThrow();
    await insert(columns, `'x', 'x@y.z', 'X', 'owner', ${instant}`);
  });

  it('keeps one studio only', async () => {
    const rows = await select<{ sql: string }>(
      `SELECT sql FROM sqlite_schema WHERE name = 'studio'`,
    );
    expect(rows[0]?.sql).toContain('CHECK (id = 1)');
    expect(await Studio.count()).toBe(0);
  });
});

describe('what never changes in place', () => {
  const frozen = [
    'order_events',
    'audit',
    'ledger_entries',
    'formula_versions',
    'formula_lines',
    'formula_steps',
    'price_book_versions',
    'policy_versions',
    'work_time_versions',
  ];

  it.each(frozen)('%s refuses both verbs', async (table) => {
    const triggers = await select<{ name: string }>(
      `SELECT name FROM sqlite_schema WHERE type = 'trigger' AND tbl_name = :table
       AND name LIKE '%_no_%' ORDER BY name`,
      { table },
    );
    expect(triggers.map(({ name }) => name)).toEqual([`${table}_no_delete`, `${table}_no_update`]);
  });

  it('refuses to change or delete a row', async () => {
    const policy = await inTransaction(() =>
      PolicyVersion.create({
        kind: 'terms',
        n: 1,
        title: 'Terms',
        text: 'As agreed.',
        validFrom: test.clock.now(),
      }),
    );
    const change = inTransaction(() => policy.update({ text: 'Otherwise.' }));
    await expect(change).rejects.toHaveProperty(
      'parent.message',
      expect.stringContaining('policy_versions is never changed in place'),
    );
    await expect(inTransaction(() => policy.destroy())).rejects.toThrow();
    expect((await PolicyVersion.findByPk(policy.id))?.text).toBe('As agreed.');
  });

  it('takes no more lines into a formula version that is in use', async () => {
    await inTransaction(async () => {
      await Ingredient.create({
        id: 'butter',
        name: 'Butter',
        labelName: 'butter',
        family: 'butter',
      });
      await Formula.create({ id: 'plain', kind: 'other', name: 'Plain' });
      const version = await FormulaVersion.create({
        formulaId: 'plain',
        n: 1,
        yieldPpm: 1_000_000,
        densityMgPerMl: 900,
      });
      const line = { versionId: version.id, ingredientId: 'butter', weightMg: 1000 };
      await FormulaLine.create({ ...line, position: 0 });
      await Formula.update({ currentVersionId: version.id }, { where: { id: 'plain' } });
    });
    const { currentVersionId } = await Formula.findByPk('plain', { rejectOnEmpty: true });
    const more = inTransaction(() =>
      FormulaLine.create({
        versionId: currentVersionId ?? '',
        ingredientId: 'butter',
        weightMg: 5,
        position: 1,
      }),
    );
    await expect(more).rejects.toThrow();
    expect(await FormulaLine.count()).toBe(1);
  });
});
