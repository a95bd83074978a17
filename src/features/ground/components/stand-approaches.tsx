import { lengthM, toLocal } from '@/core/geometry';
import { formatDistance } from '@/core/units';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ApproachRow } from '../approaches-data';
import type { FormClub } from '../form-club';
import type { ParkingRow } from '../parkings-data';
import { DIRECTION_WORDS } from '../words/kinds';
import { STAND_APPROACHES_WORDS } from '../words/stand';
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
  const walk = formatDistance(walked, units);
  return driven > 0
    ? STAND_APPROACHES_WORDS.walkedAndDriven(walk, formatDistance(driven, units))
    : STAND_APPROACHES_WORDS.onFoot(walk);
}

export function StandApproaches(props: StandApproachesProps) {
  const { club, formClub, standId, approaches, parkings, canWrite, remove } = props;
  const base = `/clubs/${club}/stands/${standId}/approaches`;
  const addLink = <ButtonLink href={`${base}/new`}>{STAND_APPROACHES_WORDS.add}</ButtonLink>;
  if (approaches.length === 0) {
    return (
      <Section title={STAND_APPROACHES_WORDS.approaches}>
        <EmptyState title={STAND_APPROACHES_WORDS.none} action={canWrite && addLink}>
          {canWrite ? STAND_APPROACHES_WORDS.noneText : STAND_APPROACHES_WORDS.noneTextAsk}
        </EmptyState>
      </Section>
    );
  }
  return (
    <Section title={STAND_APPROACHES_WORDS.approaches} actions={canWrite && addLink}>
      <Table caption={STAND_APPROACHES_WORDS.caption} captionHidden>
        <THead>
          <Th>{STAND_APPROACHES_WORDS.approach}</Th>
          <Th>{STAND_APPROACHES_WORDS.from}</Th>
          <Th>{STAND_APPROACHES_WORDS.walked}</Th>
          <Th>{STAND_APPROACHES_WORDS.length}</Th>
          <Th>{STAND_APPROACHES_WORDS.notes}</Th>
          {canWrite && <Th>{STAND_APPROACHES_WORDS.change}</Th>}
        </THead>
        <TBody>
          {approaches.map((row) => (
            <Tr key={row.id}>
              <RowHead>{row.name}</RowHead>
              <Td label={STAND_APPROACHES_WORDS.from}>
                {parkings.find((p) => p.id === row.parkingId)?.name ?? STAND_APPROACHES_WORDS.noParking}
              </Td>
              <Td label={STAND_APPROACHES_WORDS.walked}>{DIRECTION_WORDS[row.direction]}</Td>
              <Td label={STAND_APPROACHES_WORDS.length}>{lengths(row, formClub)}</Td>
              <Td label={STAND_APPROACHES_WORDS.notes}>{row.notes || '–'}</Td>
              {canWrite && (
                <Td label={STAND_APPROACHES_WORDS.change}>
                  <span className="flex flex-wrap gap-2">
                    <ButtonLink href={`${base}/${row.id}/edit`} aria-label={STAND_APPROACHES_WORDS.editLabel(row.name)}>
                      {STAND_APPROACHES_WORDS.edit}
                    </ButtonLink>
                    <RemoveButton
                      club={club}
                      at={{ id: row.id, version: row.version }}
                      name={row.name}
                      remove={remove}
                      to={`/clubs/${club}/stands/${standId}`}
                    >
                      <p>{STAND_APPROACHES_WORDS.removeText}</p>
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
