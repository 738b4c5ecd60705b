import type { ReactNode } from 'react';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';

type Props = {
  readonly title: string;
  readonly lead?: ReactNode;
  /** What else one may want, under the rim. */
  readonly aside?: ReactNode;
  readonly children: ReactNode;
};

/** A page of one small form. */
export function NarrowPage({ title, lead, aside, children }: Props) {
  return (
    <div className="page py-10">
      <div className="mx-auto grid max-w-xl gap-6">
        <div className="grid gap-3">
          <PageTitle title={title} />
          {lead && <p className="text-slate">{lead}</p>}
        </div>
        <Rim className="grid gap-6 p-5 sm:p-7">{children}</Rim>
        {aside && <div className="grid justify-items-start gap-2">{aside}</div>}
      </div>
    </div>
  );
}
