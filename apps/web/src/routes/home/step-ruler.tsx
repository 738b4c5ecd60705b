const steps = [
  { name: 'The day', line: 'How many will eat, who must not eat what, and when.' },
  { name: 'The cake', line: 'Tiers or a sheet, sponges and fillings, drawn as you choose.' },
  { name: 'Where it goes', line: 'How warm it gets there decides which buttercream stands up.' },
  { name: 'The look', line: 'Colors, words, flowers, and the pictures you have saved.' },
  { name: 'You', line: 'Who orders and who collects.' },
  { name: 'Check', line: 'Everything once more, each with a way back. Then send it.' },
] as const;

/** The order's six steps along a ruler; upright on a phone. */
export function StepRuler() {
  return (
    <ol className="grid border-cobalt max-md:border-l-[1.5px] md:grid-cols-6 md:border-t-[1.5px]">
      {steps.map(({ name, line }, at) => (
        <li
          key={name}
          className="relative grid content-start gap-1 pb-6 pl-7 md:border-l-[1.5px] md:border-cobalt md:pt-5 md:pr-3 md:pb-0 md:pl-3"
        >
          <span
            aria-hidden="true"
            className="absolute top-3 left-0 w-4 border-t-[1.5px] border-cobalt md:hidden"
          />
          <Ticks />
          <h3>
            <span className="sr-only">Step {at + 1}: </span>
            {name}
          </h3>
          <p className="text-slate">{line}</p>
        </li>
      ))}
    </ol>
  );
}

function Ticks() {
  return (
    <svg
      className="absolute inset-x-0 top-0 hidden h-2.5 w-full text-cobalt md:block"
      aria-hidden="true"
    >
      {Array.from({ length: 9 }, (_, at) => (
        <line
          key={at}
          x1={`${(at + 1) * 10}%`}
          x2={`${(at + 1) * 10}%`}
          y1="0"
          y2={at === 4 ? 10 : 6}
          stroke="currentColor"
        />
      ))}
    </svg>
  );
}
