'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { type WalkUpValues, walkUpSchema } from '@/features/outings/outing-schema';
import { newRequestKey } from '@/features/sits/request-key';
import { Button } from '@/ui/button';
import { Dialog, DialogClose } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Loading, Notice } from '@/ui/notices';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { boardKey, walkUpQuery } from '../queries';
import type { WalkUpOptions, WalkUpStand } from '../read-walk-up';
import type { Board } from '../reads';
import type { BoardActions } from './board-actions';
import { EMPTY_IS_NULL, GroundFields } from './ground-fields';

interface Props {
  club: string;
  board: Pick<Board, 'parkings' | 'contactName'>;
  walkUp: BoardActions['walkUp'];
  onDone: () => void;
}

/** The one way in there is, else none: it is for the person to say. */
const onlyWay = (stand: WalkUpStand) => (stand.waysIn.length === 1 ? stand.waysIn[0] : undefined);

function WalkUpForm({
  club,
  board,
  walkUp,
  onDone,
  options,
  first,
}: Props & { options: WalkUpOptions; first: WalkUpStand }) {
  const toast = useToast();
  const queries = useQueryClient();
  const [requestKey] = useState(newRequestKey);
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema: walkUpSchema,
    defaultValues: {
      standId: first.id,
      weapon: first.weapons[0]?.value ?? 'bow',
      requestKey,
      approachId: onlyWay(first)?.id ?? null,
      parkingId: onlyWay(first)?.parkingId ?? null,
      vehicle: options.vehicle,
      backBy: first.backBy,
      contactOff: false,
    },
    submit: (values: WalkUpValues) => walkUp(club, values),
    onDone: async (saved) => {
      toast({ title: 'Booked and signed in', text: `${saved.standName}, back by ${saved.backByText}.` });
      onDone();
      await queries.invalidateQueries({ queryKey: boardKey(club) });
    },
  });
  const stand = options.stands.find(({ id }) => id === form.watch('standId')) ?? first;
  const choose = (id: string) => {
    const next = options.stands.find((one) => one.id === id);
    if (!next) return;
    form.setValue('approachId', onlyWay(next)?.id ?? null);
    form.setValue('parkingId', onlyWay(next)?.parkingId ?? null);
    form.setValue('backBy', next.backBy);
    if (!next.weapons.some(({ value }) => value === form.getValues('weapon'))) {
      form.setValue('weapon', next.weapons[0]?.value ?? 'bow');
    }
  };
  return (
    <form {...formProps} className="grid gap-4">
      <FormErrorSummary errors={errors} />
      <Select
        label="Stand"
        options={options.stands.map(({ id, name }) => ({ value: id, label: name }))}
        {...register('standId', { onChange: (event) => choose(event.target.value) })}
        error={errorOf('standId')}
      />
      <Select label="Weapon" options={stand.weapons} {...register('weapon')} error={errorOf('weapon')} />
      <GroundFields
        register={(name) => (name.endsWith('Id') ? register(name, EMPTY_IS_NULL) : register(name))}
        errorOf={errorOf}
        waysIn={stand.waysIn}
        parkings={board.parkings}
        own
        contactName={board.contactName}
      />
      <SubmitRow label="Take it and sign in" pending={pending} pendingLabel="Signing in">
        <DialogClose>
          <Button look="quiet">Not now</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

function WalkUp(props: Props) {
  const { data, error } = useQuery(walkUpQuery(props.club));
  if (error) {
    return (
      <Notice level="caution" live title="Not loaded">
        {error.message}
      </Notice>
    );
  }
  if (!data) return <Loading label="Looking for free stands" />;
  const [first] = data.stands;
  if (!first) {
    return (
      <p>
        No stand is open to you now: each is taken, resting, closed or kept free by a rule. The Sit page says which.
      </p>
    );
  }
  return <WalkUpForm {...props} options={data} first={first} />;
}

/** At the gate without a booking: books a free stand for the window at hand and signs in at once. */
export function WalkUpDialog(props: Omit<Props, 'onDone'> & { windowText: string }) {
  const [open, setOpen] = useState(false);
  const { windowText, ...rest } = props;
  return (
    <Dialog
      title="Walk up"
      description={`A free stand for ${windowText}.`}
      trigger={<Button>Walk up</Button>}
      open={open}
      onOpenChange={setOpen}
    >
      <WalkUp {...rest} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
