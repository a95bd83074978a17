import type { FieldValues } from 'react-hook-form';
import type { ActionResult } from '@/server/doors';
import type { useActionForm } from '@/ui/form/use-action-form';

/** What the saving of a named thing answers. */
export interface Saved {
  id: string;
  name: string;
}

/** A club's server action, called with the club's slug. */
export type ClubCall<In, Out> = (club: string, values: In) => Promise<ActionResult<Out>>;

/** A form's fields are drawn by several parts: what each of them is given. */
export type Fields<Values extends FieldValues> = ReturnType<typeof useActionForm<Values, Saved>>;
