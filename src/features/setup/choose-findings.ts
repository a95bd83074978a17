import type { FindingView } from './reads';
import { CODE_WORDS, SETUP_WORDS as W } from './words/findings';

interface Option {
  value: string;
  label: string;
}

export interface FindingGroup {
  /** null: what belongs to no stand. */
  stand: { id: string; name: string } | null;
  /** The worst first. */
  findings: { finding: FindingView; number: number }[];
  /** What mending the worst of them gains. */
  gain: number;
}

const one = (asked: string | string[] | undefined, options: Option[]) =>
  options.find(({ value }) => value === asked)?.value ?? '';

/** By stand, those that cost most first; what costs alike keeps the order of the rules. Numbered through all groups. */
export function groupFindings(findings: FindingView[]): FindingGroup[] {
  const byStand = new Map<string, FindingView[]>();
  for (const finding of findings) {
    const id = finding.stand?.id ?? '';
    byStand.set(id, [...(byStand.get(id) ?? []), finding]);
  }
  const ranked = [...byStand.values()]
    .map((list) => [...list].sort((a, b) => b.gain - a.gain))
    .sort((a, b) => (b[0]?.gain ?? 0) - (a[0]?.gain ?? 0) || b.length - a.length);
  let number = 0;
  return ranked.map((list) => ({
    stand: list[0]?.stand ?? null,
    findings: list.map((finding) => ({ finding, number: ++number })),
    gain: list[0]?.gain ?? 0,
  }));
}

/** Findings of one stand, or of one kind, as the address asks, by stand; what it cannot ask for counts as all. */
export function chooseFindings(all: FindingView[], search: Record<string, string | string[] | undefined>) {
  const standsOf = ({ stand, also }: FindingView) => [...(stand ? [stand] : []), ...also];
  const byId = new Map(all.flatMap((f) => standsOf(f).map(({ id, name }) => [id, name] as const)));
  const stands: Option[] = [
    { value: '', label: W.everyStand },
    ...[...byId].map(([value, label]) => ({ value, label })).sort((a, b) => a.label.localeCompare(b.label)),
  ];
  const kinds: Option[] = [
    { value: '', label: W.everyKind },
    ...[...new Set(all.map(({ code }) => code))].map((value) => ({ value, label: CODE_WORDS[value] })),
  ];
  const [stand, what] = [one(search.stand, stands), one(search.what, kinds)];
  const open = all.filter(
    (f) => (stand === '' || standsOf(f).some(({ id }) => id === stand)) && (what === '' || f.code === what),
  );
  return { open, groups: groupFindings(open), stand, what, stands, kinds };
}
