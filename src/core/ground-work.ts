/** Kinds of work on the ground that a state or a landowner may limit. */
export const GROUND_WORKS = ['mock_scrape', 'water', 'bait', 'cutting', 'planting'] as const;
export type GroundWork = (typeof GROUND_WORKS)[number];
