import { fairnessWords } from '@/core/draw/fairness';
import { figureText, intervalText } from '@/core/indices';
import { numberText } from '@/features/clubs/read-number';
import { type Definition, DefinitionList } from '@/ui/page-parts';
import type { Report } from '../reads';
import { HEADLINE_WORDS as words } from '../words/page';

/** The season in a few plain lines. */
export function Headline({ report }: { report: Report }) {
  const { use, rests, unused, members, bumps, deer, harvest, hours } = report;
  const used = use.rows.filter(({ sits }) => sits > 0).length;
  const never = unused.filter(({ what }) => what === 'never').length;
  const share = bumps.all.share;
  const rate = deer.total.perHour.all;
  const items: (Definition | null)[] = [
    { term: words.sits, detail: words.sitsOf(report.sits, used, use.rows.length, members.sat) },
    report.unproven > 0 ? { term: words.unproven, detail: words.unprovenOf(report.unproven) } : null,
    { term: words.rests, detail: words.restsOf(rests.kept, rests.times) },
    { term: words.unused, detail: words.unusedOf(never, unused.length - never) },
    {
      term: words.fair,
      detail:
        members.ofGood === null
          ? words.fairNone
          : words.fairOf(
              fairnessWords(members.ofGood),
              members.ofGood,
              members.luck ? words.luck[members.luck.as] : '',
            ),
    },
    {
      term: words.bumps,
      detail: share.known
        ? words.bumpsOf(bumps.all.bumped, bumps.all.sits, figureText(share, 'percent'), intervalText(share, 'percent'))
        : words.bumpsNone,
    },
    {
      term: words.deer,
      detail: rate.known
        ? words.deerOf(figureText(rate), intervalText(rate), deer.total.seen.all, deer.total.hours)
        : words.deerNone,
    },
    harvest && { term: words.harvest, detail: words.harvestOf(harvest.antlered, harvest.antlerless) },
    hours && {
      term: words.hours,
      detail: words.hoursOf(numberText(hours.total), hours.rows.filter(({ total }) => total > 0).length),
    },
  ];
  return <DefinitionList className="max-w-3xl" items={items.filter((item) => item !== null)} />;
}
