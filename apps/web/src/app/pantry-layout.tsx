import { Suspense } from 'react';
import { Outlet } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { PagePending } from './page-frame.tsx';
import { SubPlaces } from './sub-places.tsx';

/** What the kitchen works from, in the order it is looked for. */
const places = [
  { to: paths.staffFormulas, name: 'Formulas' },
  { to: paths.staffIngredients, name: 'Ingredients' },
  { to: paths.staffEggs, name: 'Eggs' },
  { to: paths.staffShopping, name: 'Shopping' },
] as const;

/** The Pantry's own places, above each of its pages. */
export function PantryLayout() {
  return (
    <>
      <SubPlaces label="Pantry" places={places} />
      <Suspense fallback={<PagePending />}>
        <Outlet />
      </Suspense>
    </>
  );
}
