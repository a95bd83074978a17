'use client';

import { useFormContext } from 'react-hook-form';
import { ROLES, type Role } from '@/core/permissions';
import { RadioCards } from '@/ui/choices';
import { DateInput, Select } from '@/ui/text-inputs';
import type { SponsorChoice } from '../read-members';
import { STANDING_WORDS } from '../words/members';
import { ROLE_NOTES, ROLE_WORDS } from '../words/roles';

interface Fields {
  role: Role;
  sponsorId: string;
  guestFrom: string;
  guestTo: string;
}

interface Props {
  sponsors: SponsorChoice[];
}

const CHOICES = ROLES.map((role) => ({ value: role, label: ROLE_WORDS[role], note: ROLE_NOTES[role] }));

/** Role, and for a guest the sponsor and the days; stands inside a FormProvider. */
export function StandingFields({ sponsors }: Props) {
  const { register, watch, formState } = useFormContext<Fields>();
  const { errors } = formState;
  return (
    <>
      <RadioCards label={STANDING_WORDS.role} choices={CHOICES} {...register('role')} error={errors.role?.message} />
      {watch('role') === 'guest' && (
        <div className="flex flex-col gap-5 border-rule-strong border-l-2 pl-4">
          <Select
            label={STANDING_WORDS.sponsorId}
            hint={STANDING_WORDS.sponsorIdHint}
            placeholder={STANDING_WORDS.sponsorIdPlaceholder}
            options={sponsors.map(({ id, name }) => ({ value: id, label: name }))}
            fieldClassName="max-w-sm"
            {...register('sponsorId')}
            error={errors.sponsorId?.message}
          />
          <div className="grid gap-5 sm:grid-cols-2">
            <DateInput label={STANDING_WORDS.guestFrom} {...register('guestFrom')} error={errors.guestFrom?.message} />
            <DateInput label={STANDING_WORDS.guestTo} {...register('guestTo')} error={errors.guestTo?.message} />
          </div>
        </div>
      )}
    </>
  );
}
