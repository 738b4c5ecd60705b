import { Spinner } from './spinner.tsx';

/** Stands where an answer will be; said aloud once. */
export function Pending({ what }: { readonly what: string }) {
  return (
    <p role="status" className="flex items-center gap-3 py-8 text-slate">
      <Spinner />
      {what}
    </p>
  );
}
