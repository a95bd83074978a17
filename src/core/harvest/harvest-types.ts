/** The words of a harvest sheet (Texas agency leaflet: sex, estimated age and method, dressed weight, antlers, lactation). */

export const SEXES = ['buck', 'doe'] as const;
export type Sex = (typeof SEXES)[number];

/** Years at the autumn of the kill; deer are born about June, so ages fall on halves. */
export const AGE_CLASSES = ['fawn', '1.5', '2.5', '3.5', '4.5', '5.5_plus'] as const;
export type AgeClass = (typeof AGE_CLASSES)[number];

export const AGE_METHODS = ['teeth', 'tooth_rings', 'body'] as const;
export type AgeMethod = (typeof AGE_METHODS)[number];

export const QUOTA_DEER = ['any', 'antlered', 'antlerless'] as const;
export type QuotaDeer = (typeof QUOTA_DEER)[number];

/** member: the member's own and those of guests, who count on their sponsor. member_guests: only those of guests. */
export const QUOTA_PER = ['club', 'member', 'member_guests'] as const;
export type QuotaPer = (typeof QUOTA_PER)[number];

/** At most so many a season, 1 July to 30 June. */
export interface HarvestQuota {
  deer: QuotaDeer;
  per: QuotaPer;
  most: number;
}
