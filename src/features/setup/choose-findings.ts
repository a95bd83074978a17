import type { FindingView } from './reads';
import { CODE_WORDS } from './words';

interface Option {
  value: string;
  label: string;
}

const one = (asked: string | string[] | undefined, options: Option[]) =>
  options.find(({ value }) => value === asked)?.value ?? '';

/** Findings of one stand, or of one kind, as the address asks; what it cannot ask for counts as all. */
export function chooseFindings(all: FindingView[], search: Record<string, string | string[] | undefined>) {
  const byId = new Map(all.flatMap(({ stand }) => (stand ? [[stand.id, stand.name] as const] : [])));
  const stands: Option[] = [
    { value: '', label: 'The whole ground' },
    ...[...byId].map(([value, label]) => ({ value, label })).sort((a, b) => a.label.localeCompare(b.label)),
  ];
  const kinds: Option[] = [
    { value: '', label: 'Everything' },
    ...[...new Set(all.map(({ code }) => code))].map((value) => ({ value, label: CODE_WORDS[value] })),
  ];
  const [stand, what] = [one(search.stand, stands), one(search.what, kinds)];
  const open = all.filter((f) => (stand === '' || f.stand?.id === stand) && (what === '' || f.code === what));
  return { open, stand, what, stands, kinds };
}
