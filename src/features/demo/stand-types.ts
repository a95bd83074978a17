import type { GoodWindArc, ShelterClass, ShotSide, StandKind, Suitability, Weapon } from '@/core/ground-types';
import { ydToM } from '@/core/units';
import type { Spot } from './demo-place';

export interface DemoStand {
  key: string;
  name: string;
  kind: StandKind;
  at: Spot;
  seatHeightFt: number;
  facingDeg: number | null;
  shotSide: ShotSide;
  shotRangeM: Partial<Record<Weapon, number>>;
  shelter: ShelterClass;
  seats: number;
  arcs: GoodWindArc[];
  morning: Suitability;
  evening: Suitability;
  restDays?: number;
  mostSitsSeason?: number;
  /** Flat where left out. */
  drain?: { bearingDeg: number; slopePercent: number };
  /** Keys of the people it is kept for. */
  keptFor?: string[];
  notes: string;
}

export const good = (fromDeg: number, toDeg: number, window: GoodWindArc['window'] = null): GoodWindArc => ({
  fromDeg,
  toDeg,
  window,
});

const inYards = (yards: Partial<Record<Weapon, number>>): Partial<Record<Weapon, number>> => {
  const { bow, crossbow, muzzleloader, shotgun, rifle } = yards;
  return {
    ...(bow ? { bow: ydToM(bow) } : {}),
    ...(crossbow ? { crossbow: ydToM(crossbow) } : {}),
    ...(muzzleloader ? { muzzleloader: ydToM(muzzleloader) } : {}),
    ...(shotgun ? { shotgun: ydToM(shotgun) } : {}),
    ...(rifle ? { rifle: ydToM(rifle) } : {}),
  };
};

/** Tight cover: a bow's distance, and little more for anything else. */
export const CLOSE = inYards({ bow: 25, crossbow: 30, muzzleloader: 60, shotgun: 60, rifle: 75 });
export const OPEN_WOOD = inYards({ bow: 30, crossbow: 35, muzzleloader: 90, shotgun: 80, rifle: 120 });
export const FIELD = inYards({ bow: 30, crossbow: 40, muzzleloader: 130, shotgun: 100, rifle: 220 });
export const BOW_ONLY = inYards({ bow: 25, crossbow: 30 });
