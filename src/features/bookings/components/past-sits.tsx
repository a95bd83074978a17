import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { SitView } from '../sit-view';

function endOf(sit: SitView): string {
  if (sit.status === 'booked') return 'Ended';
  if (sit.status === 'lapsed') return 'Lapsed, unsigned';
  return sit.cancelReason ? `Cancelled: ${sit.cancelReason}` : 'Cancelled';
}

export function PastSits({ sits }: { sits: SitView[] }) {
  return (
    <Table caption="Your sits that have ended or were cancelled, the latest first" captionHidden>
      <THead>
        <Th>Stand</Th>
        <Th>When</Th>
        <Th>Club time</Th>
        <Th>Weapon</Th>
        <Th>How it ended</Th>
      </THead>
      <TBody>
        {sits.map((sit) => (
          <Tr key={sit.id}>
            <RowHead>{sit.standName}</RowHead>
            <Td label="When">{sit.whenText}</Td>
            <Td label="Club time">{sit.timeText}</Td>
            <Td label="Weapon">{sit.weaponText}</Td>
            <Td label="How it ended">{endOf(sit)}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
