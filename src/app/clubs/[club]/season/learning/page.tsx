import { DEFAULT_LEARNING } from '@/core/learning/propose-adjustments';
import { ApplyButton, UndoButton } from '@/features/learning/components/adjustment-buttons';
import { BrierList, ReliabilityTable } from '@/features/learning/components/reliability-table';
import { readLearning } from '@/features/learning/reads';
import { LEARNING_PAGE_WORDS, PROPOSALS_WORDS, signed } from '@/features/learning/words';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { applyAdjustmentAction, undoAdjustmentAction } from './actions';

const words = LEARNING_PAGE_WORDS;
const table = PROPOSALS_WORDS;

export const metadata = { title: words.title };

export default clubPage('log.read_all', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { reliability, proposals, history } = await readLearning(scope);
  const { rows, brier } = reliability;
  const may = scope.can('rules.write');
  const { leastSits, mostPoints } = DEFAULT_LEARNING;
  return (
    <>
      <PageTitle over={name} title={words.heading} lead={words.lead} />
      {brier === null ? (
        <EmptyState title={words.empty} action={<ButtonLink href={`/clubs/${slug}/log`}>{words.log}</ButtonLink>}>
          {words.emptyText}
        </EmptyState>
      ) : (
        <>
          <Section title={words.said} note={words.saidNote}>
            <ReliabilityTable rows={rows} />
          </Section>
          <Section title={words.score} note={words.scoreNote}>
            <BrierList brier={brier} />
          </Section>
          <Section title={words.stands} note={words.standsNote(mostPoints, leastSits)}>
            {proposals.length === 0 ? (
              <p className="text-ink-soft">{words.noStands(leastSits)}</p>
            ) : (
              <Table caption={table.caption} captionHidden>
                <THead>
                  <Th>{table.stand}</Th>
                  <Th align="right">{table.clean}</Th>
                  <Th align="right">{table.said}</Th>
                  <Th align="right">{table.asks}</Th>
                  <Th align="right">{table.interval}</Th>
                  <Th align="right">{table.counts}</Th>
                  {may && <Th>{table.answer}</Th>}
                </THead>
                <TBody>
                  {proposals.map((one) => (
                    <Tr key={one.standId}>
                      <RowHead>{one.standName}</RowHead>
                      <Td label={table.clean} align="right">
                        {table.cleanOf(one.clean, one.sits)}
                      </Td>
                      <Td label={table.said} align="right">
                        {one.predicted}
                      </Td>
                      <Td label={table.asks} align="right">
                        <span>
                          {signed(one.points)}
                          {!one.sure && <span className="text-ink-soft">{table.unsure}</span>}
                        </span>
                      </Td>
                      <Td label={table.interval} align="right">
                        {table.intervalOf(one.low, one.high)}
                      </Td>
                      <Td label={table.counts} align="right">
                        {one.holds === 0 ? table.nothing : signed(one.holds)}
                      </Td>
                      {may && (
                        <Td label={table.answer}>
                          {one.points !== 0 && one.points !== one.holds ? (
                            <ApplyButton
                              club={slug}
                              proposal={{
                                standId: one.standId,
                                standName: one.standName,
                                points: one.points,
                                sits: one.sits,
                              }}
                              apply={applyAdjustmentAction}
                            />
                          ) : (
                            <span className="text-ink-soft">{one.points === 0 ? table.asSums : table.applied}</span>
                          )}
                        </Td>
                      )}
                    </Tr>
                  ))}
                </TBody>
              </Table>
            )}
          </Section>
        </>
      )}
      {history.length > 0 && (
        <Section title={words.history}>
          <ul className="divide-y divide-rule">
            {history.map((one) => (
              <li key={one.id} className="flex flex-wrap items-center justify-between gap-3 py-3">
                <span>
                  <strong>{one.standName}</strong>: {one.text}
                </span>
                {one.holds && may && (
                  <UndoButton
                    club={slug}
                    stand={{ id: one.standId, name: one.standName }}
                    undo={undoAdjustmentAction}
                  />
                )}
              </li>
            ))}
          </ul>
        </Section>
      )}
    </>
  );
});
