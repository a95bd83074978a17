'use client';

import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { Dialog, DialogClose } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type CancelSitValues, cancelSitSchema } from '../sit-schema';
import type { SavedSit } from '../sit-view';
import { CANCEL_SIT_WORDS } from '../words/screens';

export type CancelAction = (club: string, values: CancelSitValues) => Promise<ActionResult<SavedSit>>;

interface CancelSitProps {
  club: string;
  cancel: CancelAction;
  sit: { id: string; standName: string; whenText: string };
  /** Somebody else's sit: they are told the reason, which is asked for. */
  memberName?: string | undefined;
}

function CancelSitForm({ club, cancel, sit, memberName, onDone }: CancelSitProps & { onDone: () => void }) {
  const toast = useToast();
  const queries = useQueryClient();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: cancelSitSchema,
    defaultValues: { sitId: sit.id, reason: '' },
    submit: (values: CancelSitValues) => cancel(club, values),
    onDone: async () => {
      toast({ title: CANCEL_SIT_WORDS.done, text: CANCEL_SIT_WORDS.doneText(sit.standName, sit.whenText) });
      onDone();
      await queries.invalidateQueries();
    },
  });
  return (
    <form {...formProps} className="flex flex-col gap-4">
      <FormErrorSummary errors={errors} />
      <p>{CANCEL_SIT_WORDS.what(sit.standName, sit.whenText, memberName)}</p>
      <Textarea
        label={CANCEL_SIT_WORDS.reason}
        optional={!memberName}
        rows={2}
        maxLength={200}
        error={errorOf('reason')}
        {...register('reason')}
      />
      <SubmitRow label={CANCEL_SIT_WORDS.cancelSit} look="danger" pending={pending}>
        <DialogClose>
          <Button>{CANCEL_SIT_WORDS.keep}</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

export function CancelSitDialog({ trigger, ...props }: CancelSitProps & { trigger?: ReactNode }) {
  const [open, setOpen] = useState(false);
  const label = CANCEL_SIT_WORDS.cancelLabel(props.sit.standName, props.sit.whenText);
  return (
    <Dialog
      title={props.memberName ? CANCEL_SIT_WORDS.cancelSit2(props.memberName) : CANCEL_SIT_WORDS.title}
      trigger={trigger ?? <Button aria-label={label}>{CANCEL_SIT_WORDS.cancel}</Button>}
      open={open}
      onOpenChange={setOpen}
    >
      <CancelSitForm {...props} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
