export const mainId = 'main';

/** The first stop of the Tab key: past the header. */
export function SkipLink() {
  return (
    <a
      href={`#${mainId}`}
      className="sr-only z-10 rounded-action bg-cobalt px-4 py-3 font-semibold text-enamel focus:not-sr-only focus:absolute focus:top-2 focus:left-2"
    >
      Skip to the page
    </a>
  );
}
