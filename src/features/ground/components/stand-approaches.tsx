import { lengthM, toLocal } from '@/core/geometry';
import { formatDistance } from '@/core/units';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ApproachRow } from '../approaches-data';
import type { FormClub } from '../form-club';
import type { ParkingRow } from '../parkings-data';
import { DIRECTION_WORDS } from '../words';
import type { ClubCall } from './form-types';
import { RemoveButton } from './remove-button';

export interface StandApproachesProps {
  club: string;
  formClub: FormClub;
  standId: string;
  approaches: ApproachRow[];
  parkings: ParkingRow[];
  canWrite: boolean;
  remove: ClubCall<{ id: string; version: number }, { name: string }>;
}

function lengths(row: ApproachRow, { lat, lon, units }: FormClub) {
  const points = row.points.map(([x = 0, y = 0]) => toLocal({ lat, lon }, { lon: x, lat: y }));
  const driven = lengthM(points.slice(0, row.vehicleToIndex + 1));
  const walked = lengthM(points) - driven;
  const walk = `${formatDistance(walked, units)} on foot`;
  return driven > 0 ? `${walk}, ${formatDistance(driven, units)} driven` : walk;
}

export function StandApproaches(props: StandApproachesProps) {
  const { club, formClub, standId, approaches, parkings, canWrite, remove } = props;
  const base = `/clubs/${club}/stands/${standId}/approaches`;
  const addLink = <ButtonLink href={`${base}/new`}>Add an approach</ButtonLink>;
  if (approaches.length === 0) {
    return (
      <Section title="Approaches">
        <EmptyState title="No way in is drawn yet" action={canWrite && addLink}>
          With an approach the ranking weighs the walk and says when to leave.
          {!canWrite && ' Ask a steward to add one.'}
        </EmptyState>
      </Section>
    );
  }
  return (
    <Section title="Approaches" actions={canWrite && addLink}>
      <Table caption="Ways in and out" captionHidden>
        <THead>
          <Th>Approach</Th>
          <Th>From</Th>
          <Th>Walked</Th>
          <Th>Length</Th>
          <Th>Notes</Th>
          {canWrite && <Th>Change</Th>}
        </THead>
        <TBody>
          {approaches.map((row) => (
            <Tr key={row.id}>
              <RowHead>{row.name}</RowHead>
              <Td label="From">{parkings.find((p) => p.id === row.parkingId)?.name ?? 'No parking place'}</Td>
              <Td label="Walked">{DIRECTION_WORDS[row.direction]}</Td>
              <Td label="Length">{lengths(row, formClub)}</Td>
              <Td label="Notes">{row.notes || '–'}</Td>
              {canWrite && (
                <Td label="Change">
                  <span className="flex flex-wrap gap-2">
                    <ButtonLink href={`${base}/${row.id}/edit`} aria-label={`Edit ${row.name}`}>
                      Edit
                    </ButtonLink>
                    <RemoveButton
                      club={club}
                      at={{ id: row.id, version: row.version }}
                      name={row.name}
                      remove={remove}
                      to={`/clubs/${club}/stands/${standId}`}
                    >
                      <p>Members will no longer be offered this way.</p>
                    </RemoveButton>
                  </span>
                </Td>
              )}
            </Tr>
          ))}
        </TBody>
      </Table>
    </Section>
  );
}
