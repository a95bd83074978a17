/** One sit as it was predicted and as it went. */
export interface SitOutcome {
  standId: string;
  /** Predicted quiet, 0-100. */
  quiet: number;
  /** Points of an adjustment that are in it. */
  adjustedBy: number;
  /** No deer bumped on the way in, in the seat or on the way out. */
  clean: boolean;
}
