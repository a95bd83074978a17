import { describe, expect, it } from 'vitest';
import { auditFilterSchema, auditSearch } from '../audit-schema';
import { actionWords, detailLines, momentText } from './audit-text';

describe('audit words', () => {
  it('reads actions and moments as people do', () => {
    expect(actionWords('member.invited_again')).toBe('member: invited again');
    const at = Date.UTC(2026, 10, 7, 11, 5);
    expect(momentText(at, { zone: 'America/New_York', units: 'us' })).toBe('Sat 7 Nov 2026, 6:05 AM');
    expect(momentText(at, { zone: 'Europe/London', units: 'metric' })).toBe('Sat 7 Nov 2026, 11:05');
  });

  it('reads a list of changes before and after, and anything else as it is', () => {
    expect(detailLines({ version: 2, reason: null, changed: [{ label: 'Rest', before: '3', after: null }] })).toEqual([
      { term: 'version', text: '2' },
      { term: 'reason', text: 'none' },
      { term: 'Rest', text: '3 → none' },
    ]);
    expect(detailLines({ replaced: [], before: { role: 'member' } })).toEqual([
      { term: 'replaced', text: '[]' },
      { term: 'before', text: '{"role":"member"}' },
    ]);
  });
});

describe('the audit filter', () => {
  it('takes blanks as no filter and goes into an address and back', () => {
    const filter = auditFilterSchema.parse({
      person: '',
      action: 'sit.booked',
      from: '2026-11-01',
      to: '',
      text: ' a&b ',
    });
    expect(filter).toEqual({ person: null, action: 'sit.booked', from: '2026-11-01', to: null, text: 'a&b' });
    const search = auditSearch(filter, 3);
    expect(search).toBe('?action=sit.booked&from=2026-11-01&text=a%26b&page=3');
    expect(auditFilterSchema.parse(Object.fromEntries(new URLSearchParams(search)))).toEqual(filter);
    expect(auditSearch(auditFilterSchema.parse({}), 1)).toBe('');
  });

  it('refuses days that are none or out of order', () => {
    expect(auditFilterSchema.safeParse({ from: '2026-02-30' }).success).toBe(false);
    expect(auditFilterSchema.safeParse({ from: '2026-11-02', to: '2026-11-01' }).success).toBe(false);
  });
});
