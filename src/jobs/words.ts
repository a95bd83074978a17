/** What each job says it did, read on the page of the club's jobs. */
export const JOB_RESULTS = {
  steps: (taken: number) => `${taken} steps taken`,
  lapsed: (lapsed: number) => `${lapsed} lapsed`,
  kept: (kept: number) => `${kept} kept`,
  reminded: (reminded: number) => `${reminded} reminded`,
  told: (told: number) => `${told} told`,
  sent: (sent: number) => `${sent} sent`,
  mailed: (sent: number, failed: number) => `${sent} sent, ${failed} failed`,
  refreshed: (refreshed: number, failed: number) => `${refreshed} refreshed, ${failed} failed`,
  orphans: (files: number, photos: number) =>
    `${files} files without a photo and ${photos} photos of what is gone removed`,
  tidied: 'old counts, runs, links and unused imports removed',
} as const;
