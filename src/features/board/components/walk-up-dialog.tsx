'use client';

import { useState } from 'react';
import { type WalkUpValues, walkUpSchema } from '@/features/outings/outing-schema';
import { newRequestKey } from '@/lib/request-key';
import { Button } from '@/ui/button';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import type { Closes } from '@/ui/lazy-part';
import { Loading, Notice } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { walkUpQuery } from '../queries';
import type { WalkUpOptions, WalkUpStand } from '../read-walk-up';
import type { Board } from '../reads';
import { WALK_UP_WORDS } from '../words/dialogs';
import type { BoardActions } from './board-actions';
import { EMPTY_IS_NULL, GroundFields } from './ground-fields';

export interface WalkUpDialogProps {
  club: string;
  board: Pick<Board, 'parkings' | 'contactName'>;
  walkUp: BoardActions['walkUp'];
  windowText: string;
}

type Props = WalkUpDialogProps & Closes;

/** The one way in there is, else none: it is for the person to say. */
const onlyWay = (stand: WalkUpStand) => (stand.waysIn.length === 1 ? stand.waysIn[0] : undefined);

function WalkUpForm({
  club,
  board,
  walkUp,
  onClose,
  options,
  first,
}: Props & { options: WalkUpOptions; first: WalkUpStand }) {
  const toast = useToast();
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
    onDone: (saved) => {
      toast({ title: WALK_UP_WORDS.done, text: WALK_UP_WORDS.doneText(saved.standName, saved.backByText) });
      onClose();
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
        label={WALK_UP_WORDS.stand}
        options={options.stands.map(({ id, name }) => ({ value: id, label: name }))}
        {...register('standId', { onChange: (event) => choose(event.target.value) })}
        error={errorOf('standId')}
      />
      <Select label={WALK_UP_WORDS.weapon} options={stand.weapons} {...register('weapon')} error={errorOf('weapon')} />
      <GroundFields
        register={(name) => (/Id$/.test(name) ? register(name, EMPTY_IS_NULL) : register(name))}
        errorOf={errorOf}
        waysIn={stand.waysIn}
        parkings={board.parkings}
        own
        contactName={board.contactName}
      />
      {options.cautions.length > 0 && (
        <Notice level="caution" title={WALK_UP_WORDS.care}>
          <ul className="list-disc pl-5">
            {options.cautions.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </Notice>
      )}
      <SubmitRow label={WALK_UP_WORDS.take} pending={pending} pendingLabel={WALK_UP_WORDS.taking}>
        <Button look="quiet" onClick={onClose}>
          {WALK_UP_WORDS.notNow}
        </Button>
      </SubmitRow>
    </form>
  );
}

function WalkUp(props: Props) {
  const { data, error } = useRead(walkUpQuery(props.club));
  if (error) {
    return (
      <Notice level="caution" live title={WALK_UP_WORDS.notLoaded}>
        {error.message}
      </Notice>
    );
  }
  if (!data) return <Loading label={WALK_UP_WORDS.looking} />;
  const [first] = data.stands;
  if (!first) return <p>{WALK_UP_WORDS.nothing}</p>;
  return <WalkUpForm {...props} options={data} first={first} />;
}

/** At the gate without a booking: books a free stand for the window at hand and signs in at once. */
export function WalkUpDialog(props: Props) {
  const { windowText, onClose } = props;
  return (
    <Dialog
      title={WALK_UP_WORDS.title}
      description={WALK_UP_WORDS.about(windowText)}
      open
      onOpenChange={(open) => !open && onClose()}
    >
      <WalkUp {...props} />
    </Dialog>
  );
}
