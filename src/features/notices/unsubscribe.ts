import type { NoticeKind } from '@/core/notices/notice-kinds';
import { write } from '@/db/client';
import { hashSecret } from '@/lib/secrets';
import { notFound } from '@/server/errors';
import { findNoticeLink, putChoices } from './choices-data';

export interface NoticeLink {
  clubName: string;
  slug: string;
  kind: NoticeKind;
  /** It is stopped already. */
  stopped: boolean;
}

/** What a link in a mail stops; null when it is unknown or too old. */
export async function readNoticeLink(secret: string): Promise<NoticeLink | null> {
  const found = await findNoticeLink(hashSecret(secret));
  if (!found) return null;
  const { clubName, slug, kind, choices } = found;
  return { clubName, slug, kind, stopped: !choices.kinds.includes(kind) };
}

/** Stops one kind of notice of one member, by the secret in the mail alone; twice changes nothing. */
export async function unsubscribe(secret: string, now: number): Promise<{ kind: NoticeKind }> {
  return write(async (tx) => {
    const found = await findNoticeLink(hashSecret(secret), tx);
    if (!found) throw notFound();
    const { clubId, memberId, kind, choices } = found;
    if (choices.kinds.includes(kind)) {
      const kinds = choices.kinds.filter((one) => one !== kind);
      await putChoices(tx, { clubId, memberId, now }, { ...choices, kinds });
    }
    return { kind };
  });
}
