import { type ReactNode, createContext, useContext, useState } from 'react';
import { createPortal } from 'react-dom';
import { Link } from 'react-router-dom';

const SlotContext = createContext<HTMLElement | null>(null);

type Props = {
  readonly name: string;
  readonly homeTo: string;
  readonly mark?: ReactNode;
  readonly nav: ReactNode;
  readonly children: ReactNode;
};

/**
 * The top of every page: the cobalt line, the studio's name, the places. A page may put its own
 * words where the places are (`HeaderSlot`), as the order does with its draft.
 */
export function SiteHeader({ name, homeTo, mark, nav, children }: Props) {
  const [slot, setSlot] = useState<HTMLElement | null>(null);
  return (
    <SlotContext value={slot}>
      <header className="border-t-[5px] border-b border-t-cobalt border-b-cobalt print:border-t-2">
        <div className="page flex min-h-14 flex-wrap items-center has-[[data-slot]:not(:empty)]:flex-nowrap gap-x-4 gap-y-1 py-1.5 sm:gap-x-6">
          <Link
            to={homeTo}
            aria-label={name === '' ? 'First page' : undefined}
            className="inline-flex min-h-11 items-center gap-3 rounded-mark font-display text-lg leading-tight font-bold text-cobalt max-[23rem]:text-base sm:text-xl"
          >
            {mark}
            {name === '' ? <span className="inline-block h-5 w-40 rounded-mark bg-cloud" /> : name}
          </Link>
          <div
            ref={setSlot}
            data-print="no"
            data-slot
            className="peer ml-auto flex flex-wrap items-center justify-end gap-x-5 empty:hidden"
          />
          <div data-print="no" className="contents peer-[:not(:empty)]:hidden">
            {nav}
          </div>
        </div>
      </header>
      {children}
    </SlotContext>
  );
}

/** Puts its children where the header's places are, for as long as the page shows it. */
export function HeaderSlot({ children }: { readonly children: ReactNode }) {
  const place = useContext(SlotContext);
  return place === null ? null : createPortal(children, place);
}
