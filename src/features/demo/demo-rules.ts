import { type ClubRules, DEFAULT_CLUB_RULES, type Season } from '@/core/booking/rules';
import { addDays } from '@/core/day-time';
import { ydToM } from '@/core/units';

const LIGHT = 'Deer, all seasons';
const SOURCE = 'State hunting digest, entered by the club';

/** Seasons laid about a day, so that the demo is in season whenever it is made. */
function seasonsAbout(today: string): Season[] {
  const from = (n: number) => addDays(today, n);
  const light = { legalLightName: LIGHT };
  return [
    { id: 'archery', name: 'Archery', weapons: ['bow', 'crossbow'], fromDay: from(-76), toDay: from(59), ...light },
    {
      id: 'early-muzzleloader',
      name: 'Early muzzleloader',
      weapons: ['muzzleloader'],
      fromDay: from(-41),
      toDay: from(-34),
      ...light,
    },
    { id: 'firearms', name: 'Firearms', weapons: ['rifle', 'shotgun'], fromDay: from(-10), toDay: from(12), ...light },
    {
      id: 'late-muzzleloader',
      name: 'Late muzzleloader',
      weapons: ['muzzleloader'],
      fromDay: from(24),
      toDay: from(45),
      ...light,
    },
  ];
}

export function demoRules(today: string): ClubRules {
  const bow = ydToM(200);
  const gun = ydToM(300);
  const statedOn = addDays(today, -110);
  return {
    ...DEFAULT_CLUB_RULES,
    legalLight: [{ name: LIGHT, minutesBeforeSunrise: 30, minutesAfterSunset: 30, source: SOURCE, statedOn }],
    seasons: seasonsAbout(today),
    maxLiveClaims: 3,
    mostSitsPerMemberSeason: 40,
    spacingM: { bow, crossbow: bow, muzzleloader: gun, shotgun: gun, rifle: gun },
    orangeRule: {
      text: 'In firearms season wear 250 square inches of orange on head, chest and back, seen from all sides.',
      source: SOURCE,
      statedOn,
    },
    harvestQuotas: [
      { deer: 'antlered', per: 'member', most: 1 },
      { deer: 'antlerless', per: 'club', most: 6 },
      { deer: 'any', per: 'member_guests', most: 2 },
    ],
    stateHarvestRule: {
      text: 'Antlered deer: as the licence says. Antlerless deer: in the weeks and numbers the digest gives for the county.\nTag a deer before it is moved and report it by the end of the next day.',
      source: SOURCE,
      statedOn,
    },
    workRules: {
      ...DEFAULT_CLUB_RULES.workRules,
      mock_scrape: {
        text: 'Scrapes may be laid with soil and a licking branch. Bottled scent only as the digest lists it.',
        source: SOURCE,
        statedOn,
      },
      cutting: {
        text: 'Brush and limbs under four inches. Ask the landowner before any tree that would make a log.',
        source: 'Lease, paragraph 7',
        statedOn,
      },
    },
  };
}
