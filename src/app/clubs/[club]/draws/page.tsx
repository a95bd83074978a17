import { readDraws } from '@/features/draws/reads';
import { DRAWS_WORDS as WORDS } from '@/features/draws/words/screens';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { Badge, PageTitle } from '@/ui/page-parts';

export const metadata = { title: WORDS.title };

export default clubPage('draws.enter', async ({ scope }) => {
  const { slug, name } = scope.club;
  const draws = await readDraws(scope, now());
  const may = scope.can('draws.write');
  const add = may ? <ButtonLink href={`/clubs/${slug}/draws/new`}>{WORDS.open}</ButtonLink> : null;
  return (
    <>
      <PageTitle over={name} title={WORDS.title} lead={WORDS.lead} actions={draws.length > 0 ? add : null} />
      {draws.length === 0 ? (
        <EmptyState title={WORDS.none} action={add}>
          {may ? WORDS.noneForAdmin : WORDS.noneForMember}
        </EmptyState>
      ) : (
        <ul className="divide-y divide-rule">
          {draws.map((draw) => (
            <li key={draw.id} className="flex flex-wrap items-center justify-between gap-3 py-3">
              <a className="font-semibold font-serif underline" href={`/clubs/${slug}/draws/${draw.id}`}>
                {draw.title}
              </a>
              <Badge look={draw.state === 'open' ? 'moss' : 'plain'}>{draw.stateText}</Badge>
            </li>
          ))}
        </ul>
      )}
    </>
  );
});
