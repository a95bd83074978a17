import ICAL from 'ical.js';
import { describe, expect, it } from 'vitest';
import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { sitWindow } from '@/core/windows';
import { type CalendarEntry, type CalendarSit, sitCalendar, sitUid } from './sit-calendar';

const SIT: CalendarSit = {
  id: 'sit_abc',
  sequence: 0,
  status: 'booked',
  startAt: Date.UTC(2026, 10, 7, 11, 19),
  endAt: Date.UTC(2026, 10, 7, 16),
  createdAt: Date.UTC(2026, 10, 1),
  updatedAt: Date.UTC(2026, 10, 2, 3, 4, 5),
};

const SHOWN = { summary: 'Sit: Oak Ladder', description: 'morning', location: 'Oak Ladder, Our Club', place: null };

const make = (entry: Partial<CalendarEntry> = {}, name = 'Our Club') =>
  sitCalendar({ name, method: 'PUBLISH', entries: [{ sit: SIT, shown: SHOWN, ...entry }] });

/** Read back by ical.js, a parser that shares nothing with the writer. */
function parse(text: string) {
  const calendar = new ICAL.Component(ICAL.parse(text));
  const events = calendar.getAllSubcomponents('vevent').map((event) => new ICAL.Event(event));
  const event = events[0];
  if (!event) throw new Error('no event');
  return { calendar, events, event, component: event.component };
}

describe('a calendar of sits (RFC 5545, read by ical.js)', () => {
  it('keeps the same UID and takes SEQUENCE and DTSTAMP from the sit', () => {
    const first = parse(make());
    const second = parse(make({ sit: { ...SIT, sequence: 3, startAt: SIT.startAt + 60_000 } }));
    expect(first.event.uid).toBe('sit_abc@windrest');
    expect(second.event.uid).toBe(first.event.uid);
    expect(first.event.uid).toBe(sitUid(SIT.id));
    expect([first.event.sequence, second.event.sequence]).toEqual([0, 3]);
    expect(first.component.getFirstPropertyValue('dtstamp')?.toString()).toBe('2026-11-02T03:04:05Z');
  });

  it('says CONFIRMED, and CANCELLED once cancelled', () => {
    expect(parse(make()).component.getFirstPropertyValue('status')).toBe('CONFIRMED');
    const cancelled = make({ sit: { ...SIT, status: 'cancelled' } });
    expect(parse(cancelled).component.getFirstPropertyValue('status')).toBe('CANCELLED');
  });

  it('names the method, the organizer and the member for a mail', () => {
    const text = sitCalendar({
      name: 'Our Club',
      method: 'CANCEL',
      entries: [
        {
          sit: SIT,
          shown: SHOWN,
          organizer: { name: 'Our "Old" Club', email: 'club@example.test' },
          attendee: { name: 'Ann; "Annie" Roe', email: 'ann@example.test' },
        },
      ],
    });
    const { calendar, event } = parse(text);
    expect(calendar.getFirstPropertyValue('method')).toBe('CANCEL');
    expect(event.organizer).toBe('mailto:club@example.test');
    expect(event.attendees).toHaveLength(1);
    expect(event.attendees[0]?.getFirstValue()).toBe('MAILTO:ann@example.test');
    expect(event.attendees[0]?.getParameter('cn')).toBe("Ann; 'Annie' Roe");
  });

  it('gives text back as it was, and lets nothing typed become a line of its own', () => {
    const description = `Gate, then; left \\ up\nBEGIN:VEVENT\nSUMMARY:false\n${'long '.repeat(60)}é 日本`;
    const text = make({ shown: { ...SHOWN, summary: 'A, B; C\r\nEND:VCALENDAR', description } }, 'Oaks, Elms; \\ Co');
    const { events, event, calendar } = parse(text);
    expect(events).toHaveLength(1);
    expect(event.summary).toBe('A, B; C END:VCALENDAR');
    expect(event.description).toBe(description);
    // ical.js does not know RFC 7986's NAME and leaves its escapes as they are written.
    expect(calendar.getFirstPropertyValue('name')).toBe('Oaks\\, Elms\\; \\\\ Co');
    for (const line of text.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
  });

  it('carries a position only where one is given', () => {
    expect(make()).not.toMatch(/GEO|34\.1/);
    const placed = parse(make({ shown: { ...SHOWN, place: { lat: 34.1175, lon: -84.0021 } } }));
    expect(placed.component.getFirstPropertyValue('geo')).toEqual([34.1175, -84.0021]);
  });

  // Clocks in New York went back on 1 November 2026 and forward on 14 March 2027 (15 U.S.C. 260a).
  it.each([
    ['2026-10-31', '11:00', '2026-10-31T15:00:00Z'],
    ['2026-11-01', '11:00', '2026-11-01T16:00:00Z'],
    ['2027-03-13', '11:00', '2027-03-13T16:00:00Z'],
    ['2027-03-14', '11:00', '2027-03-14T15:00:00Z'],
  ])('ends the morning of %s at %s by the club clock', (day, _clock, utc) => {
    const place = { lat: 34.117, lon: -84, zone: 'America/New_York' };
    const { startAt, endAt } = sitWindow(day, 'morning', DEFAULT_CLUB_RULES, place);
    const { event } = parse(make({ sit: { ...SIT, startAt, endAt } }));
    expect(event.endDate.toString()).toBe(utc);
    expect(event.startDate.toJSDate().getTime()).toBe(Math.floor(startAt / 1000) * 1000);
  });
});
