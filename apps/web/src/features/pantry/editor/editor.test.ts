import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formulaDraft } from '#shared/contracts/pantry.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { pantryFixture } from '#web/testing/pantry.ts';
import { shelfOf } from '../shelf.ts';
import { editorReducer } from './editor-actions.ts';
import { type EditorForm, emptyForm, formOfVersion } from './editor-form.ts';
import { inspectForm } from './inspect-form.ts';
import { readRow, settledText } from './read-row.ts';

const shelf = shelfOf(pantryFixture());
const custard = shelf.formulas.get('custard')?.current;
if (custard === undefined) throw new Error('The pantry has its custard.');
const start = formOfVersion(
  custard,
  { name: 'Vanilla custard', kind: 'custard' },
  shelf.index,
  'F',
);

const inspect = (form: EditorForm) =>
  inspectForm(form, {
    shelf,
    formulaId: 'custard',
    against: custard,
    percentOf: null,
    house: menuFixture.studio,
  });

/** Types into the row at a place. */
function typed(form: EditorForm, at: number, text: string): EditorForm {
  const row = form.lines[at];
  if (row === undefined) throw new Error('There is no such row.');
  const { words } = readRow(row, shelf.index);
  return editorReducer(form, { type: 'text', key: row.key, text, words });
}

describe('the form of a formula', () => {
  it('says of an untouched version exactly what the version says', () => {
    const { draft, changes, problems } = inspect(start);
    expect(problems).toEqual([]);
    expect(draft).toEqual(formulaDraft.parse(custard));
    expect(changes).toEqual([]);
  });

  it('keeps the part of a line whose amount alone is typed anew', () => {
    for (const [at, line] of custard.lines.entries()) {
      const text = start.lines[at]?.text.replace(/^[\d.]+/, '77') ?? '';
      expect(inspect(typed(start, at, text)).draft?.lines[at]).toMatchObject({
        part: line.part,
        grams: 77,
      });
    }
  });

  it('takes either figure of a line that disagrees with itself', () => {
    // 1 1/2 cups of sugar are 300 g (USDA SR28 19335: a cup is 200 g).
    const form = typed(start, 1, '1 1/2 cups sugar, 250 g');
    const row = form.lines[1];
    if (row === undefined) throw new Error('There is no such row.');
    const reading = readRow(row, shelf.index);
    const [finding] = reading.findings;
    if (finding === undefined) throw new Error('The proofreader saw it.');
    for (const [take, grams] of [
      ['measure', 300],
      ['weight', 250],
    ] as const) {
      const settled = typed(form, 1, settledText(finding, take, reading));
      const line = settled.lines[1];
      if (line === undefined) throw new Error('There is no such row.');
      const now = readRow(line, shelf.index);
      expect(now).toMatchObject({ grams, findings: [], part: reading.part });
    }
  });

  it('marks what cannot be read at its row, counts the rest, and loses nothing of it', () => {
    const form = editorReducer(start, {
      type: 'add-lines',
      at: 5,
      texts: ['a handful of love', '100 g butter', 'German buttercream, 50 g'],
    });
    const { problems, seen, draft } = inspect(form);
    const keys = form.lines.map((it) => it.key);
    expect(problems.map((it) => it.name)).toEqual([`lines.${keys[5]}`, `lines.${keys[7]}`]);
    expect(problems[1]?.message).toMatch(/^Line 8, .*uses itself/);
    expect(seen.totals.inG).toBe(2086 + 150);
    expect(draft).toBeNull();
    expect(form.lines[5]?.text).toBe('a handful of love');
    const key = keys[5] ?? -1;
    expect(editorReducer(form, { type: 'to-note', key }).fields.note).toBe('a handful of love');
  });

  it('says at the field that no more can come out than goes in', () => {
    const form = editorReducer(start, { type: 'fields', fields: { yieldPercent: '120' } });
    expect(inspect(form).problems).toEqual([{ name: 'yieldPpm', message: 'Not over 100 %.' }]);
  });

  it('lets lines follow their step when steps move or go', () => {
    const [first, second] = start.steps;
    if (first === undefined || second === undefined) throw new Error('It has two steps.');
    const moved = editorReducer(start, { type: 'move-step', key: second.key, by: -1 });
    expect(moved.lines.map((it) => it.step)).toEqual([1, 1, 1, 1, 0]);
    const gone = editorReducer(moved, { type: 'remove-step', key: first.key });
    expect(gone.lines.map((it) => it.step)).toEqual([0, 0, 0, 0, 0]);
  });

  it('makes steps of a pasted recipe’s headings', () => {
    const form = editorReducer(emptyForm, {
      type: 'paste',
      pasted: {
        headings: ['For the custard', 'For the cream'],
        lines: [
          { text: '340 g milk', stage: 1 },
          { text: '570 g\tbutter', stage: 2 },
        ],
      },
    });
    expect(form.steps.map((it) => it.text)).toEqual(['For the custard', 'For the cream']);
    expect(form.lines.map((it) => [it.text, it.step])).toEqual([
      ['340 g milk', 0],
      ['570 g butter', 1],
    ]);
  });

  it('never loses or doubles a line by moving', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.nat(4), fc.constantFrom(1 as const, -1 as const)), { maxLength: 30 }),
        (moves) => {
          const form = moves.reduce(
            (now, [at, by]) =>
              editorReducer(now, { type: 'move-line', key: now.lines[at]?.key ?? 0, by }),
            start,
          );
          expect(form.lines.map((it) => it.key).toSorted()).toEqual([0, 1, 2, 3, 4]);
        },
      ),
    );
  });
});
