/** By force, 0-12; what is seen on land after the WMO. */
export const BEAUFORT_WORDS = [
  { name: 'calm', onLand: 'smoke goes straight up' },
  { name: 'light air', onLand: 'smoke drifts, a vane stays still' },
  { name: 'light breeze', onLand: 'felt on the face, leaves rustle' },
  { name: 'gentle breeze', onLand: 'leaves and twigs always moving' },
  { name: 'moderate breeze', onLand: 'small branches move' },
  { name: 'fresh breeze', onLand: 'small trees begin to sway' },
  { name: 'strong breeze', onLand: 'large branches move' },
  { name: 'near gale', onLand: 'whole trees move' },
  { name: 'gale', onLand: 'twigs break off' },
  { name: 'strong gale', onLand: 'slight damage to buildings' },
  { name: 'storm', onLand: 'small trees uprooted' },
  { name: 'violent storm', onLand: 'large branches snap' },
  { name: 'hurricane force', onLand: 'wide damage' },
] as const;

/** From the new moon on, principal phases and what lies between them in turn. */
export const MOON_NAMES = [
  'New moon',
  'Waxing crescent',
  'First quarter',
  'Waxing gibbous',
  'Full moon',
  'Waning gibbous',
  'Last quarter',
  'Waning crescent',
] as const;
export type MoonName = (typeof MOON_NAMES)[number];
