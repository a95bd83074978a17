'use client';

import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import type { Closes } from '@/ui/lazy-part';
import { queryClient } from '@/ui/query';
import { Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type CancelSitValues, cancelSitSchema } from '../sit-schema';
import type { SavedSit } from '../sit-view';
import { CANCEL_SIT_WORDS } from '../words/screens';

export type CancelAction = (club: string, values: CancelSitValues) => Promise<ActionResult<SavedSit>>;

export interface CancelSitProps {
  club: string;
  cancel: CancelAction;
  sit: { id: string; standName: string; whenText: string };
  /** Somebody else's sit: they are told the reason, which is asked for. */
  memberName?: string | undefined;
}

function CancelSitForm({ club, cancel, sit, memberName, onClose }: CancelSitProps & Closes) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: cancelSitSchema,
    defaultValues: { sitId: sit.id, reason: '' },
    submit: (values: CancelSitValues) => cancel(club, values),
    onDone: async () => {
      toast({ title: CANCEL_SIT_WORDS.done, text: CANCEL_SIT_WORDS.doneText(sit.standName, sit.whenText) });
      onClose();
      await queryClient().invalidateQueries();
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
        <Button onClick={onClose}>{CANCEL_SIT_WORDS.keep}</Button>
      </SubmitRow>
    </form>
  );
}

export function CancelSitDialog(props: CancelSitProps & Closes) {
  const { memberName, onClose } = props;
  return (
    <Dialog
      title={memberName ? CANCEL_SIT_WORDS.cancelSit2(memberName) : CANCEL_SIT_WORDS.title}
      open
      onOpenChange={(open) => !open && onClose()}
    >
      <CancelSitForm {...props} />
    </Dialog>
  );
}
