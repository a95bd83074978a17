import { randomBytes } from 'node:crypto';

const ALPHABET = '0123456789abcdefghjkmnpqrstvwxyz';

export const ID_PREFIXES = {
  user: 'usr',
  token: 'tok',
  club: 'clb',
  membership: 'mbr',
  invitation: 'inv',
  parking: 'prk',
  stand: 'std',
  closure: 'cls',
  approach: 'app',
  feature: 'ftr',
  mapItem: 'map',
  import: 'imp',
  photo: 'pho',
  visit: 'vis',
  logVersion: 'lgv',
  harvest: 'hrv',
  chore: 'cho',
  inspection: 'ins',
  workDay: 'wrk',
  sit: 'sit',
  claim: 'clm',
  outing: 'out',
  sitLink: 'lnk',
  feed: 'fed',
  audit: 'aud',
  mail: 'mal',
  adjustment: 'adj',
  draw: 'drw',
  drawRun: 'drn',
} as const;

export type IdKind = keyof typeof ID_PREFIXES;

/** A prefix for the reader and 80 random bits. */
export function newId(kind: IdKind): string {
  let text = '';
  for (const byte of randomBytes(16)) text += ALPHABET[byte & 31];
  return `${ID_PREFIXES[kind]}_${text}`;
}
