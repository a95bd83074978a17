import type { MultiPolygon, Position } from 'geojson';

/** What may be laid over a map for a while. Places are [lon, lat]. */
export interface MapOverlay {
  /** Areas laid over one another, the widest first. */
  bands?: MultiPolygon[];
  /** Pieces of a walk; weight 0-1 is how much each costs. */
  stretches?: { from: Position; to: Position; weight: number }[];
  sun?: { at: Position; azimuthDeg: number } | null;
  sitters?: { at: Position; name: string }[];
  /** Lines of equal height. */
  contours?: Position[][];
  here?: { at: Position; accuracyM: number } | null;
  measured?: Position[];
}
