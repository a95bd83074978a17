import type { Role } from '@/core/permissions';

/** One for all, and only in the demo: it is printed by the tool that makes it. */
export const DEMO_PASSWORD = 'walk in quiet, sit still';

export interface DemoPerson {
  key: string;
  name: string;
  email: string;
  /** Days ago. */
  joined: number;
}

const person = (key: string, name: string, joined: number): DemoPerson => ({
  key,
  name,
  email: `${key}@example.org`,
  joined,
});

/** Invented people. */
export const PEOPLE: readonly DemoPerson[] = [
  person('nora', 'Nora Bexley', 1400),
  person('silas', 'Silas Overby', 1390),
  person('abel', 'Abel Thornquist', 1380),
  person('ione', 'Ione Mabry', 900),
  person('odalys', 'Odalys Fenwick', 1100),
  person('rufus', 'Rufus Tarkin', 1100),
  person('lenore', 'Lenore Abbey', 820),
  person('hollis', 'Hollis Quarrier', 700),
  person('dell', 'Dell Pomfrey', 460),
  person('juno', 'Juno Ashgrove', 450),
  person('perry', 'Perry Lindwall', 20),
  person('edith', 'Edith Marrow', 1400),
  person('bram', 'Bram Castlow', 300),
];

export interface DemoMember {
  key: string;
  role: Role;
  /** Guests: who answers for them. */
  sponsor?: string;
}

export const MEMBERS: readonly DemoMember[] = [
  { key: 'nora', role: 'admin' },
  { key: 'silas', role: 'admin' },
  { key: 'abel', role: 'steward' },
  { key: 'ione', role: 'steward' },
  { key: 'odalys', role: 'member' },
  { key: 'rufus', role: 'member' },
  { key: 'lenore', role: 'member' },
  { key: 'hollis', role: 'member' },
  { key: 'dell', role: 'member' },
  { key: 'juno', role: 'member' },
  { key: 'perry', role: 'guest', sponsor: 'odalys' },
  { key: 'edith', role: 'landowner' },
];

/** The small second club: one of its two also belongs to the first. */
export const SECOND_CLUB_MEMBERS: readonly DemoMember[] = [
  { key: 'juno', role: 'admin' },
  { key: 'bram', role: 'member' },
];
