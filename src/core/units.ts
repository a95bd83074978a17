/** Conversions by exact definitions: 1 yd = 0.9144 m, 1 ft = 0.3048 m, 1 mi = 1609.344 m (International Yard and Pound, 1959); 1 nautical mile = 1852 m. */

export const UNIT_SYSTEMS = ['us', 'metric'] as const;
export type Units = (typeof UNIT_SYSTEMS)[number];

const M_PER_YD = 0.9144;
const M_PER_FT = 0.3048;
const M_PER_MI = 1609.344;
const MPS_PER_MPH = M_PER_MI / 3600;
const MPS_PER_KT = 1852 / 3600;
const MM_PER_IN = 25.4;
/** Avoirdupois pound, exact (International Yard and Pound, 1959). */
const KG_PER_LB = 0.45359237;
const M2_PER_ACRE = 43560 * M_PER_FT * M_PER_FT;
/** Conventional inch of mercury at 0 degrees C (NIST SP 811, appendix B). */
const HPA_PER_INHG = 33.86389;

export const ydToM = (yd: number): number => yd * M_PER_YD;
export const mToYd = (m: number): number => m / M_PER_YD;
export const ftToM = (ft: number): number => ft * M_PER_FT;
export const mToFt = (m: number): number => m / M_PER_FT;
export const miToM = (mi: number): number => mi * M_PER_MI;
export const mToMi = (m: number): number => m / M_PER_MI;
export const mphToMps = (mph: number): number => mph * MPS_PER_MPH;
export const mpsToMph = (mps: number): number => mps / MPS_PER_MPH;
export const ktToMps = (kt: number): number => kt * MPS_PER_KT;
export const mpsToKt = (mps: number): number => mps / MPS_PER_KT;
export const kmhToMps = (kmh: number): number => kmh / 3.6;
export const mpsToKmh = (mps: number): number => mps * 3.6;
export const fToC = (f: number): number => ((f - 32) * 5) / 9;
export const cToF = (c: number): number => (c * 9) / 5 + 32;
export const inToMm = (inches: number): number => inches * MM_PER_IN;
export const mmToIn = (mm: number): number => mm / MM_PER_IN;
export const lbToKg = (lb: number): number => lb * KG_PER_LB;
export const kgToLb = (kg: number): number => kg / KG_PER_LB;
export const inHgToHpa = (inHg: number): number => inHg * HPA_PER_INHG;
export const hPaToInHg = (hPa: number): number => hPa / HPA_PER_INHG;
export const acreToM2 = (acre: number): number => acre * M2_PER_ACRE;
export const m2ToAcre = (m2: number): number => m2 / M2_PER_ACRE;
export const m2ToHa = (m2: number): number => m2 / 10000;

/** No minus sign on a rounded zero. */
function whole(value: number): string {
  return String(Math.round(value) + 0);
}

/** Metres for people: whole yards under half a mile, then miles; whole metres under a kilometre, then kilometres. */
export function formatDistance(m: number, units: Units): string {
  if (units === 'us') return m < M_PER_MI / 2 ? `${whole(mToYd(m))} yd` : `${mToMi(m).toFixed(1)} mi`;
  return m < 1000 ? `${whole(m)} m` : `${(m / 1000).toFixed(1)} km`;
}

/** A height in metres for people: whole feet, or metres to a tenth. */
export function formatHeight(m: number, units: Units): string {
  return units === 'us' ? `${whole(mToFt(m))} ft` : `${m.toFixed(1)} m`;
}

/** Metres a second for people: whole miles or kilometres an hour. */
export function formatSpeed(mps: number, units: Units): string {
  return units === 'us' ? `${whole(mpsToMph(mps))} mph` : `${whole(mpsToKmh(mps))} km/h`;
}

/** Degrees C for people: whole degrees F or C. */
export function formatTemp(c: number, units: Units): string {
  return units === 'us' ? `${whole(cToF(c))} °F` : `${whole(c)} °C`;
}

/** Millimetres of rain for people: hundredths of an inch, or tenths of a millimetre. */
export function formatRain(mm: number, units: Units): string {
  return units === 'us' ? `${mmToIn(mm).toFixed(2)} in` : `${mm.toFixed(1)} mm`;
}

/** Hectopascals for people: hundredths of an inch of mercury, or whole hectopascals. */
export function formatPressure(hPa: number, units: Units): string {
  return units === 'us' ? `${hPaToInHg(hPa).toFixed(2)} in` : `${whole(hPa)} hPa`;
}

/** Kilograms for people: whole pounds, or kilograms to a tenth. */
export function formatWeight(kg: number, units: Units): string {
  return units === 'us' ? `${whole(kgToLb(kg))} lb` : `${kg.toFixed(1)} kg`;
}

/** Square metres for people: acres or hectares to a tenth. */
export function formatArea(m2: number, units: Units): string {
  return units === 'us' ? `${m2ToAcre(m2).toFixed(1)} acres` : `${m2ToHa(m2).toFixed(1)} ha`;
}

/** A distance that a rule compares: a tenth of a yard or metre, rounded down so that a short one never reads as enough. */
export function formatExactDistance(m: number, units: Units): string {
  const value = units === 'us' ? mToYd(m) : m;
  return `${Math.floor((value + 1e-6) * 10) / 10} ${units === 'us' ? 'yd' : 'm'}`;
}
