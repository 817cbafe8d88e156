import type { Role } from '../contracts/roles';

/** The made-up shop that a first start shows. Invented people; `.test` addresses exist nowhere (RFC 2606). */
export interface DemoPerson {
  name: string;
  role: Role;
  email: string;
}

export const DEMO_COMPANY = {
  name: 'Alder & Finch Electric',
  timeZone: 'America/Chicago',
} as const;

/** One for all of them, printed by `npm start`: the demo runs on the machine of whoever tries it. */
export const DEMO_PASSWORD = 'fish-tape-42';

/** One person per role, the owner first. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { name: 'Nora Alder', role: 'owner', email: 'owner@demo.fairlead.test' },
  { name: 'Sam Finch', role: 'estimator', email: 'estimator@demo.fairlead.test' },
  { name: 'Rosa Delgado', role: 'foreman', email: 'foreman@demo.fairlead.test' },
  { name: 'Eli Brandt', role: 'crew', email: 'crew@demo.fairlead.test' },
];
