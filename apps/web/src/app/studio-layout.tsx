import { Suspense } from 'react';
import { Outlet } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { PagePending } from './page-frame.tsx';
import { SubPlaces } from './sub-places.tsx';

/** What the owner looks after, in the order it is looked for. */
const places = [
  { to: paths.staffPeople, name: 'People', end: true },
  { to: paths.staffPrices, name: 'Prices' },
  { to: paths.staffAllergies, name: 'Allergies' },
  { to: paths.staffKitchen, name: 'Kitchen' },
] as const;

/** The Studio's own places, above each of its pages. */
export function StudioLayout() {
  return (
    <>
      <SubPlaces label="Studio" places={places} />
      <Suspense fallback={<PagePending />}>
        <Outlet />
      </Suspense>
    </>
  );
}
