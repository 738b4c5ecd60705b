import type { TaskKind } from '#shared/contracts/vocabulary.ts';
import { classNames } from '#web/lib/class-names.ts';

/** The five sorts of work the week is read by; each has a shape and a colour of its own. */
export const workSorts = ['bake', 'batch', 'coat', 'decorate', 'hand-over'] as const;
export type WorkSort = (typeof workSorts)[number];

export const sortOf: Readonly<Record<TaskKind, WorkSort>> = {
  bake: 'bake',
  custard: 'batch',
  buttercream: 'batch',
  filling: 'batch',
  'fill-and-crumb-coat': 'coat',
  'final-coat': 'coat',
  cover: 'coat',
  decorate: 'decorate',
  stack: 'decorate',
  box: 'hand-over',
  handover: 'hand-over',
};

export const sortWords: Readonly<Record<WorkSort, string>> = {
  bake: 'bake',
  batch: 'batch',
  coat: 'fill, coat',
  decorate: 'decorate',
  'hand-over': 'hand over',
};

/** One kind of work in a word, under its bead. */
export const taskWords: Readonly<Record<TaskKind, string>> = {
  bake: 'bake',
  custard: 'custard',
  buttercream: 'cream',
  filling: 'filling',
  'fill-and-crumb-coat': 'fill',
  'final-coat': 'final',
  cover: 'cover',
  decorate: 'decorate',
  stack: 'stack',
  box: 'box',
  handover: 'hand over',
};

type Props = {
  readonly sort: WorkSort;
  /** Done work is hollow. */
  readonly done?: boolean;
  readonly className?: string;
};

const fills: Readonly<Record<WorkSort, string>> = {
  bake: 'var(--color-butter)',
  batch: 'var(--color-cobalt)',
  coat: 'color-mix(in srgb, var(--color-cobalt) 48%, var(--color-enamel))',
  decorate: 'var(--color-berry)',
  'hand-over': 'var(--color-leaf)',
};

/** Sponge, bowl, palette knife's edge, piped point, cloche: the bead of a sort of work. */
export function TaskGlyph({ sort, done = false, className }: Props) {
  const paint = {
    fill: done ? 'var(--color-enamel)' : fills[sort],
    stroke: done ? fills[sort] : 'var(--color-ink)',
    strokeWidth: done ? 2 : 0.9,
  };
  return (
    <svg
      viewBox="0 0 16 16"
      className={classNames('shrink-0', className ?? 'size-4')}
      aria-hidden="true"
    >
      {sort === 'bake' && <circle cx="8" cy="8" r="5.6" {...paint} />}
      {sort === 'batch' && <path d="M2 4.5h12c0 5.2-2.6 8-6 8s-6-2.8-6-8z" {...paint} />}
      {sort === 'coat' && <rect x="2.6" y="2.6" width="10.8" height="10.8" {...paint} />}
      {sort === 'decorate' && <path d="M8 1.4L14.6 8 8 14.6 1.4 8z" {...paint} />}
      {sort === 'hand-over' && <path d="M2.4 13V8.6a5.6 5.6 0 0 1 11.2 0V13z" {...paint} />}
    </svg>
  );
}
