import type { StaffRole } from '#shared/contracts/vocabulary.ts';

/** Who works at the demo's studio. Their passwords are printed when it starts; nobody else has them. */
export const demoStaff: readonly {
  readonly name: string;
  readonly email: string;
  readonly role: StaffRole;
  readonly password: string;
  /** At the bench, where they work at it. */
  readonly personId: string | null;
}[] = [
  {
    name: 'Ida Thorne',
    email: 'ida@oxbowlane.example',
    role: 'owner',
    password: 'thirty eggs and one whisk',
    personId: 'ida',
  },
  {
    name: 'Noor Haddad',
    email: 'noor@oxbowlane.example',
    role: 'baker',
    password: 'cold butter and warm hands',
    personId: 'noor',
  },
  {
    name: 'Joss Wren',
    email: 'joss@oxbowlane.example',
    role: 'baker',
    password: 'a level cup of cake flour',
    personId: 'joss',
  },
  {
    name: 'Pia Lund',
    email: 'pia@oxbowlane.example',
    role: 'counter',
    password: 'ribbon in the top drawer',
    personId: null,
  },
];
