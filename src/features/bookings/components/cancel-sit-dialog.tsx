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
      toast({ title: 'Sit cancelled', text: `${sit.standName}, ${sit.whenText}, is free again.` });
      onDone();
      await queries.invalidateQueries();
    },
  });
  return (
    <form {...formProps} className="flex flex-col gap-4">
      <FormErrorSummary errors={errors} />
      <p>
        {sit.standName}, {sit.whenText}. The stand is free again at once. The sit stays on record as cancelled
        {memberName ? `, and ${memberName} is told by e-mail.` : '.'}
      </p>
      <Textarea
        label="Reason"
        optional={!memberName}
        rows={2}
        maxLength={200}
        error={errorOf('reason')}
        {...register('reason')}
      />
      <SubmitRow label="Cancel the sit" look="danger" pending={pending}>
        <DialogClose>
          <Button>Keep the sit</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

export function CancelSitDialog({ trigger, ...props }: CancelSitProps & { trigger?: ReactNode }) {
  const [open, setOpen] = useState(false);
  const label = `Cancel ${props.sit.standName}, ${props.sit.whenText}`;
  return (
    <Dialog
      title={props.memberName ? `Cancel the sit of ${props.memberName}` : 'Cancel this sit'}
      trigger={trigger ?? <Button aria-label={label}>Cancel</Button>}
      open={open}
      onOpenChange={setOpen}
    >
      <CancelSitForm {...props} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
