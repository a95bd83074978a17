import { readDraws } from '@/features/draws/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { Badge, PageTitle } from '@/ui/page-parts';

export const metadata = { title: 'Draws' };

export default clubPage('draws.enter', async ({ scope }) => {
  const { slug, name } = scope.club;
  const draws = await readDraws(scope, now());
  const may = scope.can('draws.write');
  const add = may ? <ButtonLink href={`/clubs/${slug}/draws/new`}>Open a draw</ButtonLink> : null;
  return (
    <>
      <PageTitle
        over={name}
        title="Draws"
        lead="For a day on which more want a stand than there are stands: rank what you would like, and the sums share them out under every rule."
        actions={draws.length > 0 ? add : null}
      />
      {draws.length === 0 ? (
        <EmptyState title="No draw yet" action={add}>
          {may
            ? 'Open one for a busy day: opening morning, the first cold Saturday.'
            : 'A club admin opens a draw for a busy day. Until then stands are booked from the list.'}
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
