/** A share 0-1 in per cent, to a tenth under ten; a dash for none known. */
export function shareText(share: number | null): string {
  if (share === null) return '–';
  const percent = share * 100;
  return `${percent.toFixed(percent > 0 && percent < 9.95 ? 1 : 0)} %`;
}
