/**
 * The season that "sits a season" and "guest days a season" are counted over: 1 July to 30 June, so that one autumn and
 * winter never fall into two counts (our choice).
 */
export function huntingYear(day: string): { fromDay: string; toDay: string } {
  const year = Number(day.slice(0, 4));
  const first = day.slice(5) >= '07-01' ? year : year - 1;
  const pad = (y: number) => String(y).padStart(4, '0');
  return { fromDay: `${pad(first)}-07-01`, toDay: `${pad(first + 1)}-06-30` };
}
