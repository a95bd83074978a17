'use client';

import { Button } from '@/ui/button';
import { type Closes, LazyDialog, makeLazy } from '@/ui/lazy-part';
import { CANCEL_BUTTON_WORDS } from '../words/screens';
import type { CancelSitProps } from './cancel-sit-dialog';

const lazyCancel = makeLazy<CancelSitProps & Closes>(() =>
  import('./cancel-sit-dialog').then((parts) => parts.CancelSitDialog),
);

export function CancelSitButton(props: CancelSitProps) {
  const { standName, whenText } = props.sit;
  return (
    <LazyDialog
      of={lazyCancel}
      part={props}
      trigger={(opener) => (
        <Button {...opener} aria-label={CANCEL_BUTTON_WORDS.cancelLabel(standName, whenText)}>
          {CANCEL_BUTTON_WORDS.cancel}
        </Button>
      )}
    />
  );
}
