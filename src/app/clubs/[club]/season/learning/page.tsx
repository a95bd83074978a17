import { DEFAULT_LEARNING } from '@/core/learning/propose-adjustments';
import { ApplyButton, UndoButton } from '@/features/learning/components/adjustment-buttons';
import { BrierList, ReliabilityTable } from '@/features/learning/components/reliability-table';
import { readLearning } from '@/features/learning/reads';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { applyAdjustmentAction, undoAdjustmentAction } from './actions';

export const metadata = { title: 'Learning' };

const signed = (points: number) => (points > 0 ? `+${points}` : String(points));

export default clubPage('log.read_all', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { reliability, proposals, history } = await readLearning(scope);
  const { rows, brier } = reliability;
  const may = scope.can('rules.write');
  const { leastSits, mostPoints } = DEFAULT_LEARNING;
  return (
    <>
      <PageTitle
        over={name}
        title="Learning from the log"
        lead="Is a quiet of 70 really seven clean sits in ten? What is thought of each sit is kept as its window begins, and held against its log."
      />
      {brier === null ? (
        <EmptyState
          title="Nothing to compare yet"
          action={<ButtonLink href={`/clubs/${slug}/log`}>Go to the log</ButtonLink>}
        >
          Once sits have begun and their logs are written, they are counted here. A sit is clean when no deer was
          bumped.
        </EmptyState>
      ) : (
        <>
          <Section
            title="Said and come"
            note="A sit is clean when its log says no deer was bumped: in, sitting or out. Deer bumped unseen are in no log."
          >
            <ReliabilityTable rows={rows} />
          </Section>
          <Section
            title="The score of it"
            note="Mean square of what was said less what came, in its parts (Murphy 1973)."
          >
            <BrierList brier={brier} />
          </Section>
          <Section
            title="What the log asks of each stand"
            note={`Points of quiet to add to the sums, held back for few sits, never more than ${mostPoints} either way, for stands with ${leastSits} sits or more. Nothing counts until an admin applies it. Where the interval holds 0 it may be chance.`}
          >
            {proposals.length === 0 ? (
              <p className="text-ink-soft">No stand has {leastSits} sits with a log yet.</p>
            ) : (
              <Table caption="Proposed adjustments by stand" captionHidden>
                <THead>
                  <Th>Stand</Th>
                  <Th align="right">Clean of sits</Th>
                  <Th align="right">Said</Th>
                  <Th align="right">Asks for</Th>
                  <Th align="right">95 % interval</Th>
                  <Th align="right">Counts now</Th>
                  {may && <Th>Answer</Th>}
                </THead>
                <TBody>
                  {proposals.map((one) => (
                    <Tr key={one.standId}>
                      <RowHead>{one.standName}</RowHead>
                      <Td label="Clean of sits" align="right">
                        {one.clean} of {one.sits}
                      </Td>
                      <Td label="Said" align="right">
                        {one.predicted}
                      </Td>
                      <Td label="Asks for" align="right">
                        <span>
                          {signed(one.points)}
                          {!one.sure && <span className="text-ink-soft"> (unsure)</span>}
                        </span>
                      </Td>
                      <Td label="95 % interval" align="right">
                        {signed(one.low)} to {signed(one.high)}
                      </Td>
                      <Td label="Counts now" align="right">
                        {one.holds === 0 ? 'nothing' : signed(one.holds)}
                      </Td>
                      {may && (
                        <Td label="Answer">
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
                            <span className="text-ink-soft">{one.points === 0 ? 'As the sums say' : 'Applied'}</span>
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
        <Section title="Applied and undone">
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
