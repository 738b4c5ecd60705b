import { classNames } from '#web/lib/class-names.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';

type Props = {
  readonly fits: { readonly fits: boolean; readonly sentence: string };
  readonly className?: string;
};

/** Whether the plan has room for an order: leaf where it fits, attention where nothing is promised. */
export function FitLine({ fits, className }: Props) {
  return (
    <p className={classNames('flex gap-2 text-sm font-semibold', className)}>
      <ToneGlyph tone={fits.fits ? 'leaf' : 'butter'} />
      <span className={fits.fits ? 'text-leaf' : undefined}>{fits.sentence}</span>
    </p>
  );
}
