import { TaskGlyph, sortWords, workSorts } from '#web/components/order/task-glyph.tsx';

/** What the beads stand for. */
export function Legend() {
  return (
    <ul aria-label="Beads" className="flex flex-wrap gap-x-8 gap-y-2 px-1 text-sm text-slate">
      {workSorts.map((sort) => (
        <li key={sort} className="inline-flex items-center gap-2">
          <TaskGlyph sort={sort} />
          {sortWords[sort]}
        </li>
      ))}
      <li className="inline-flex items-center gap-2">
        <TaskGlyph sort="bake" done />
        done
      </li>
    </ul>
  );
}
