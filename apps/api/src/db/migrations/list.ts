import { studioAndCatalogue } from './0001-studio-and-catalogue.ts';
import { pantry } from './0002-pantry.ts';
import { orders } from './0003-orders.ts';
import { plan } from './0004-plan.ts';
import { people } from './0005-people.ts';
import { moneyAndMail } from './0006-money-and-mail.ts';
import { pantryDepth } from './0007-pantry-depth.ts';
import { careCodes } from './0008-care-codes.ts';
import { cuttingCakes } from './0009-cutting-cakes.ts';
import { talksAndServing } from './0010-talks-and-serving.ts';
import type { Migration } from './migration.ts';

/** Every migration in the order they run. Names are fixed once released; new ones go last. */
export const migrations: readonly Migration[] = [
  studioAndCatalogue,
  pantry,
  orders,
  plan,
  people,
  moneyAndMail,
  pantryDepth,
  careCodes,
  cuttingCakes,
  talksAndServing,
];
