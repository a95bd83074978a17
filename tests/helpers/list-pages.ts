import { readdirSync } from 'node:fs';
import { resolve, sep } from 'node:path';
import { createClient } from '@libsql/client';

const app = resolve(import.meta.dirname, '../../src/app');

/** Every page of src/app as its address with the parts in brackets: '/clubs/[club]/stands/[stand]'. */
export function listPages(): string[] {
  return readdirSync(app, { recursive: true, encoding: 'utf8' })
    .map((file) => file.split(sep).join('/'))
    .filter((file) => /(^|\/)page\.tsx$/.test(file))
    .map((file) => file.replace(/(^|\/)page\.tsx$/, ''))
    .map((path) => `/${path.replace(/\([^)]*\)\/?/g, '')}`.replace(/\/$/, '') || '/')
    .sort();
}

/** A real thing of the demo club for each part of an address, by the query that finds it. */
const THINGS: Record<string, string> = {
  club: "select slug from clubs where slug = 'tansy-fork'",
  stand: 'select stand_id from approaches where removed_at is null and club_id = :club order by id limit 1',
  approach: 'select id from approaches where removed_at is null and club_id = :club order by id limit 1',
  feature: 'select id from features where removed_at is null and club_id = :club order by id limit 1',
  parking: 'select id from parkings where removed_at is null and club_id = :club order by id limit 1',
  member: 'select id from memberships where removed_at is null and club_id = :club order by id limit 1',
  harvest: 'select id from harvests where club_id = :club order by id limit 1',
  chore: 'select id from chores where club_id = :club order by id limit 1',
  draw: 'select id from draws where club_id = :club order by id limit 1',
  import: 'select id from imports where club_id = :club order by id limit 1',
  workday: 'select id from work_days where club_id = :club order by id limit 1',
  // A sit of the person who looks, since a log is written by who sat.
  sit: `select sits.id from sits join memberships m on m.id = sits.member_id join users u on u.id = m.user_id
        where u.email = :email and sits.start_at < :now and sits.status = 'booked' order by sits.start_at desc limit 1`,
};

/** Parts that stand for a secret or a kept mail: an address that leads nowhere shows the page's own answer to that. */
const LEADS_NOWHERE = ['token', 'id'];

/** Fills the parts of an address for one person; null: nothing in the demo stands for one of them. */
export async function fillerOf(databaseUrl: string, email: string): Promise<(page: string) => string | null> {
  const client = createClient({ url: databaseUrl });
  const [club] = (await client.execute("select id from clubs where slug = 'tansy-fork'")).rows;
  const found = new Map<string, string>();
  for (const [part, sql] of Object.entries(THINGS)) {
    const known = { club: String(club?.id), email, now: Date.now() };
    const args = Object.fromEntries(Object.entries(known).filter(([name]) => sql.includes(`:${name}`)));
    const [row] = (await client.execute({ sql, args })).rows;
    if (row) found.set(part, String(row[0]));
  }
  client.close();
  return (page) => {
    const parts = [...page.matchAll(/\[(\w+)\]/g)].map(([, part]) => part ?? '');
    const thingFor = (part: string) => found.get(part) ?? (LEADS_NOWHERE.includes(part) ? 'none' : undefined);
    if (parts.some((part) => thingFor(part) === undefined)) return null;
    return page.replace(/\[(\w+)\]/g, (_, part: string) => thingFor(part) ?? '');
  };
}

/** Pages on which a part leads nowhere in the demo. */
export function leadsNowhere(page: string): boolean {
  return LEADS_NOWHERE.some((part) => page.includes(`[${part}]`));
}
