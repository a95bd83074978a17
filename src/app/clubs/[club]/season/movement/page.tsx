import { MONTH_NAMES } from '@/features/coverage/words';
import { LineSection } from '@/features/movement/components/line-section';
import { MovementMap } from '@/features/movement/components/movement-map';
import { readMovement } from '@/features/movement/reads';
import { MOVEMENT_WORDS as W } from '@/features/movement/words';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';

export const metadata = { title: W.title };

export default clubPage('features.read', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { lines, month } = await readMovement(scope, now());
  const drawn = lines.map(({ id, name: line, morning, legs, gaps }) => ({ id, name: line, morning, legs, gaps }));
  return (
    <>
      <PageTitle over={name} title={W.title} lead={W.lead(MONTH_NAMES[month - 1] ?? '')} />
      {lines.length === 0 ? (
        <EmptyState title={W.none} action={<ButtonLink href={`/clubs/${slug}/ground`}>{W.draw}</ButtonLink>}>
          {W.noneText}
        </EmptyState>
      ) : (
        <MovementMap club={slug} lines={drawn} />
      )}
      {lines.map((line) => (
        <LineSection key={line.id} club={slug} line={line} />
      ))}
    </>
  );
});
