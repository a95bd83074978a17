import { Section } from '@/ui/page-parts';
import type { BlockedRow } from '../view-types';
import { SIT_LIST_WORDS } from '../words/list';
import { WordMark } from './word-mark';

/** Stands a rule stops, each with the rule, who or what holds it, and when it ends. */
export function BlockedList({ rows }: { rows: BlockedRow[] }) {
  if (rows.length === 0) return null;
  return (
    <Section title={SIT_LIST_WORDS.blocked} note={SIT_LIST_WORDS.blockedNote}>
      <ul>
        {rows.map((row) => (
          <li
            key={row.standId}
            id={row.standId}
            className="blocked-row grid items-baseline gap-x-5 border-rule border-b py-2.5"
          >
            <h3 className="font-serif text-lg">{row.name}</h3>
            <WordMark word={row.word} />
            <div className="col-span-2 lg:col-span-1">
              {row.gates.map((gate) => (
                <p key={`${gate.code} ${gate.text}`}>
                  {gate.text}{' '}
                  {gate.ends && (
                    <span className="whitespace-nowrap text-ink-soft">{SIT_LIST_WORDS.until(gate.ends)}</span>
                  )}
                </p>
              ))}
            </div>
          </li>
        ))}
      </ul>
    </Section>
  );
}
