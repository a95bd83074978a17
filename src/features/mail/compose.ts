import { MAIL_FRAME_WORDS } from './words';

export interface MailParts {
  paragraphs: string[];
  /** Rows of a small table: stand, window, back by. */
  facts?: { label: string; value: string }[];
  button?: { label: string; url: string };
  /** Said after the button. */
  after?: string[];
  /** null: the mail comes from Windrest itself. */
  clubName: string | null;
  /** Why the reader gets this; stands above the name at the foot. */
  footer?: string;
  /** Small links under it: to stop such mail, to choose. */
  footLinks?: { label: string; url: string }[];
}

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign);
}

function foot({ clubName, footer }: MailParts): string[] {
  const name = clubName ? MAIL_FRAME_WORDS.by(clubName) : 'Windrest';
  return footer ? [footer, name] : [name];
}

function plain(parts: MailParts): string {
  const { paragraphs, facts = [], button, after = [], footLinks: links = [] } = parts;
  const blocks = [
    ...paragraphs,
    ...(facts.length > 0 ? [facts.map(({ label, value }) => `${label}: ${value}`).join('\n')] : []),
    ...(button ? [`${button.label}:\n${button.url}`] : []),
    ...after,
    `-- \n${[...foot(parts), ...links.map(({ label, url }) => `${label}: ${url}`)].join('\n')}`,
  ];
  return `${blocks.join('\n\n')}\n`;
}

const BODY = 'margin:0;padding:24px;background:#f7f3ea;color:#22201b;font:16px/1.5 Georgia,serif';
const BUTTON =
  'display:inline-block;padding:12px 20px;background:#3f5138;color:#ffffff;font:bold 16px sans-serif;text-decoration:none';
const FOOT = 'margin-top:28px;padding-top:12px;border-top:1px solid #b9b09c;color:#5c564a;font-size:14px';

const smallLink = ({ label, url }: { label: string; url: string }) =>
  `<a style="color:#5c564a" href="${escapeHtml(url)}">${escapeHtml(label)}</a>`;
const paragraph = (text: string) => `<p>${escapeHtml(text).replace(/\n/g, '<br>')}</p>`;

function rich(parts: MailParts): string {
  const { paragraphs, facts = [], button, after = [], footLinks: links = [] } = parts;
  const rows = facts.map(
    ({ label, value }) =>
      `<tr><th align="left" style="padding:2px 16px 2px 0;font-weight:normal;color:#5c564a">${escapeHtml(label)}</th>` +
      `<td style="padding:2px 0">${escapeHtml(value)}</td></tr>`,
  );
  return [
    `<!doctype html><html lang="en"><body style="${BODY}"><div style="max-width:36rem">`,
    ...paragraphs.map(paragraph),
    ...(rows.length > 0 ? [`<table style="border-collapse:collapse">${rows.join('')}</table>`] : []),
    ...(button ? [`<p><a style="${BUTTON}" href="${escapeHtml(button.url)}">${escapeHtml(button.label)}</a></p>`] : []),
    ...(button
      ? [`<p style="font-size:14px;word-break:break-all">${escapeHtml(MAIL_FRAME_WORDS.orOpen(button.url))}</p>`]
      : []),
    ...after.map(paragraph),
    `<p style="${FOOT}">${[...foot(parts).map(escapeHtml), ...links.map(smallLink)].join('<br>')}</p>`,
    '</div></body></html>',
  ].join('\n');
}

/** The same words as plain text and as simple HTML. Every address must be http or https. */
export function composeMail(parts: MailParts): { text: string; html: string } {
  for (const { url } of [...(parts.button ? [parts.button] : []), ...(parts.footLinks ?? [])]) {
    if (!/^https?:\/\//.test(url)) throw new Error(`A mail links to ${url}, which is no web address.`);
  }
  return { text: plain(parts), html: rich(parts) };
}
