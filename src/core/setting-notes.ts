import type { Evidence } from './verdict-types';

/** What the settings of whereabouts, approach, pressure, promise and score rest on; see SETTING_NOTES. */
export const HUNT_SETTING_NOTES: Record<string, { evidence: Evidence; note: string }> = {
  'whereabouts.use.*': {
    evidence: 'practice',
    note: 'Food by night and twilight, bedding by day, water at midday, travel lines at dawn and dusk. Food up to five times more by night (Henderson 2023); 85 % of male scrape visits after dark (Alexy 2001).',
  },
  'whereabouts.rutMonths': { evidence: 'practice', note: 'November over much of the range; a club sets its own.' },
  'whereabouts.preRutMonths': {
    evidence: 'study',
    note: 'Scraping peaks two to three weeks before breeding (Miller & Marchinton 1999).',
  },
  'whereabouts.rutTravelFactor': {
    evidence: 'study',
    note: 'The twilight pattern fades in the rut (Demarais 1989); kept small.',
  },
  'whereabouts.preRutScrapeFactor': { evidence: 'our choice', note: 'Small: most visits are after dark all the same.' },
  'whereabouts.mostInUse': {
    evidence: 'our choice',
    note: 'One or two groups of deer within 500 m, however many places are mapped there.',
  },
  'approach.walkingSpeedMps': { evidence: 'our choice', note: 'A quiet walk, about 2.2 miles an hour.' },
  'approach.vehicleSpeedMps': { evidence: 'our choice', note: 'A slow drive on a farm track.' },
  'approach.sourceHeightM': { evidence: 'our choice', note: 'Half the height of a person.' },
  'approach.passingMinutes': {
    evidence: 'our choice',
    note: 'Scent of a walker hangs for a while after he has passed.',
  },
  'approach.seenNearChance': {
    evidence: 'study',
    note: 'Well under the 70 % within 100 m of people on a trail (Taylor & Knight 2003): open unhunted land is an upper bound for woods.',
  },
  'approach.seenReachM': { evidence: 'practice', note: 'Disturbance carries 200-400 yards.' },
  'approach.maskMost': { evidence: 'our choice', note: 'Wind masks noise; only the direction of the effect is known.' },
  'approach.darkFactor': {
    evidence: 'our choice',
    note: 'Deer see well in the dark; people are still harder to make out.',
  },
  'approach.*': { evidence: 'our choice', note: 'No published figure was found.' },
  'pressure.halfLifeDays': {
    evidence: 'study',
    note: "A Sunday's shift lasted to Wednesday (Wiskirchen 2022); 1.5 days leaves a quarter after three.",
  },
  'pressure.bumpHalfLifeDays': {
    evidence: 'study',
    note: 'Chased deer were back within 13 hours to a day (D’Angelo 2003, Sweeney 1971).',
  },
  'pressure.mostCut': {
    evidence: 'study',
    note: '17 to 31 % less by day after a weekend (Wiskirchen 2022). Several studies found nothing (Karns 2012, Chance 2019): weak.',
  },
  'pressure.twilightShare': { evidence: 'study', note: 'No change in the twilight hours (Sullivan 2018).' },
  'pressure.distanceM': { evidence: 'practice', note: 'Felt 200-400 yards around a stand.' },
  'pressure.*': { evidence: 'our choice', note: 'No published figure was found.' },
  'promise.suitability.*': { evidence: 'practice', note: "The steward's own rating of the window." },
  'promise.sunCost': { evidence: 'practice', note: 'A low sun in the face hides deer and shows the sitter.' },
  'promise.crosswindSpan': { evidence: 'practice', note: 'A wind across the line keeps scent off it both ways.' },
  'promise.sightingsPriorHours': {
    evidence: 'club log',
    note: "A stand's own count is shrunk to the club's mean by this many hours.",
  },
  'promise.defaultRatePerHour': { evidence: 'study', note: '2.7 deer in 3.7 hours over 487 hunts (Meier 2025).' },
  'promise.movement.*': { evidence: 'study', note: 'Movement peaks at twilight (Webb 2010).' },
  'promise.moonWeight': { evidence: 'study', note: 'No effect of the moon was found (Webb 2010).' },
  'promise.barometerWeight': { evidence: 'our choice', note: 'No peer-reviewed effect was found.' },
  'promise.*': { evidence: 'our choice', note: 'No published figure was found.' },
  'score.quietPower': { evidence: 'practice', note: 'A poor stand that alerts nobody beats a good one that does.' },
  'score.*': { evidence: 'our choice', note: 'What matters is that quiet weighs more than promise.' },
};
