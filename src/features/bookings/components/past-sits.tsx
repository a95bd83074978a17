import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { SitView } from '../sit-view';
import { PAST_SITS_WORDS } from '../words/screens';

function endOf(sit: SitView): string {
  if (sit.status === 'booked') return PAST_SITS_WORDS.ended;
  if (sit.status === 'lapsed') return PAST_SITS_WORDS.lapsed;
  return sit.cancelReason ? PAST_SITS_WORDS.cancelledFor(sit.cancelReason) : PAST_SITS_WORDS.cancelled;
}

export function PastSits({ sits }: { sits: SitView[] }) {
  return (
    <Table caption={PAST_SITS_WORDS.caption} captionHidden>
      <THead>
        <Th>{PAST_SITS_WORDS.stand}</Th>
        <Th>{PAST_SITS_WORDS.when}</Th>
        <Th>{PAST_SITS_WORDS.clubTime}</Th>
        <Th>{PAST_SITS_WORDS.weapon}</Th>
        <Th>{PAST_SITS_WORDS.end}</Th>
      </THead>
      <TBody>
        {sits.map((sit) => (
          <Tr key={sit.id}>
            <RowHead>{sit.standName}</RowHead>
            <Td label={PAST_SITS_WORDS.when}>{sit.whenText}</Td>
            <Td label={PAST_SITS_WORDS.clubTime}>{sit.timeText}</Td>
            <Td label={PAST_SITS_WORDS.weapon}>{sit.weaponText}</Td>
            <Td label={PAST_SITS_WORDS.end}>{endOf(sit)}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
