import type { MultiPolygon, Position } from 'geojson';

/** What may be laid over a map for a while. Places are [lon, lat]. */
export interface MapOverlay {
  /** Areas laid over one another, the widest first. */
  bands?: MultiPolygon[];
  /** Pieces of a walk; weight 0-1 is how much each costs. */
  stretches?: { from: Position; to: Position; weight: number }[];
  /** Lines deer travel, leg by leg: way 1 is along the path, -1 against it, null not known. */
  legs?: { name: string; path: Position[]; served: boolean; way: 1 | -1 | null }[];
  /** Stretches of lines that no stand reaches. */
  gaps?: Position[][];
  /** From a stand to a place it can shoot at. */
  reaches?: { from: Position; to: Position }[];
  sun?: { at: Position; azimuthDeg: number } | null;
  sitters?: { at: Position; name: string }[];
  /** Lines of equal height. */
  contours?: Position[][];
  here?: { at: Position; accuracyM: number } | null;
  measured?: Position[];
}
