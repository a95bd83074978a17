import type { Report } from '../reads';

export interface PartProps {
  /** Slug, for addresses. */
  club: string;
  report: Report;
}
