import { useEffect, useRef } from 'react';
import { Link } from 'react-router-dom';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';

/** The orders whose allergens are others than their customers were told. */
export function TouchedOrders({ numbers }: { readonly numbers: readonly number[] }) {
  const box = useRef<HTMLDivElement>(null);
  // It stands above what was just saved at the foot of the page, and must not be missed there.
  useEffect(() => {
    box.current?.scrollIntoView({ block: 'center' });
    box.current?.focus({ preventScroll: true });
  }, [numbers]);
  return (
    <div ref={box} tabIndex={-1}>
      <Notice
        tone="berry"
        live="assertive"
        title={
          numbers.length === 1
            ? 'One open order now contains something else'
            : `${numbers.length} open orders now contain something else`
        }
      >
        <p>Their customers must be told before the cake is handed over.</p>
        <ul className="flex flex-wrap gap-x-4">
          {numbers.map((number) => (
            <li key={number}>
              <Link
                to={paths.staffOrder(number)}
                className="link inline-flex min-h-11 items-center tabular-nums"
              >
                Order No. {number}
              </Link>
            </li>
          ))}
        </ul>
      </Notice>
    </div>
  );
}
