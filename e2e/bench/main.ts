import { evaluate } from './evaluate.ts';
import { firstLoad } from './first-load.ts';
import { formula } from './formula.ts';
import { fuzz } from './fuzz.ts';
import { killedWorkers } from './kills.ts';
import { photos } from './photos.ts';
import { races } from './races.ts';
import { type Figure, type Part, table } from './report.ts';
import { estimates, menu } from './routes.ts';

/*
 * `npm run bench`: what is too slow or too large a number for a test. `npm run bench -- menu photos`
 * runs those parts alone. Ends with 1 when a target is missed.
 */

const parts: readonly Part[] = [
  evaluate,
  formula,
  menu,
  estimates,
  firstLoad,
  photos,
  killedWorkers,
  fuzz,
  races,
];

const asked = process.argv.slice(2);
const unknown = asked.filter((name) => parts.every((part) => part.name !== name));
if (unknown.length > 0) {
  console.error(`There is no part called ${unknown.join(', ')}. There are:`);
  for (const { name, about } of parts) console.error(`  ${name.padEnd(12)} ${about}`);
  process.exit(2);
}

const figures: Figure[] = [];
for (const part of parts) {
  if (asked.length > 0 && !asked.includes(part.name)) continue;
  const started = performance.now();
  console.log(`\n${part.name}: ${part.about}`);
  figures.push(...(await part.run((line) => console.log(`  ${line}`))));
  console.log(`  took ${((performance.now() - started) / 1000).toFixed(0)} s`);
}

console.log(`\n${table(figures)}`);
process.exit(figures.every(({ reached }) => reached) ? 0 : 1);
