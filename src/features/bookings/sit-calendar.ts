import ical, {
  ICalAttendeeRole,
  ICalAttendeeStatus,
  ICalCalendarMethod,
  type ICalEventData,
  ICalEventStatus,
} from 'ical-generator';

/** What a calendar has to know of a sit. Instants are UTC milliseconds. */
export interface CalendarSit {
  id: string;
  sequence: number;
  status: 'booked' | 'cancelled' | 'lapsed';
  startAt: number;
  endAt: number;
  createdAt: number;
  updatedAt: number;
}

/** What one reader may see of it. */
export interface EntryText {
  summary: string;
  description: string;
  location: string | null;
  /** Given only where the reader asked for positions. */
  place: { lat: number; lon: number } | null;
}

interface Person {
  name: string;
  email: string;
}

export interface CalendarEntry {
  sit: CalendarSit;
  shown: EntryText;
  organizer?: Person;
  attendee?: Person;
}

/** The same in the mail and in each feed, so that a calendar sees one event. */
export function sitUid(sitId: string): string {
  return `${sitId}@windrest`;
}

/** RFC 5545 3.1: a parameter value holds no double quote and no control character. */
function parameterText(text: string): string {
  return plainLine(text).replaceAll('"', "'");
}

function plainLine(text: string): string {
  return text.replace(/\p{Cc}+/gu, ' ').trim();
}

/** The library writes a calendar's name as it is; RFC 5545 3.3.11 wants these escaped. */
function escapeName(text: string): string {
  return plainLine(text).replace(/[\\;,]/g, (mark) => `\\${mark}`);
}

function locationOf({ location, place }: EntryText): ICalEventData['location'] {
  if (location === null) return null;
  return place ? { title: location, geo: place } : { title: location };
}

/** Times are written in UTC: right over every change of clocks, whatever zone the reader's calendar is in. */
export function sitCalendar(calendar: {
  name: string;
  method: 'REQUEST' | 'CANCEL' | 'PUBLISH';
  /** How often a subscriber should look again, seconds. */
  refreshSeconds?: number;
  entries: CalendarEntry[];
}): string {
  const made = ical({
    name: escapeName(calendar.name),
    prodId: { company: 'Windrest', product: 'Sits', language: 'EN' },
    method: ICalCalendarMethod[calendar.method],
    ...(calendar.refreshSeconds ? { ttl: calendar.refreshSeconds } : {}),
  });
  for (const { sit, shown, organizer, attendee } of calendar.entries) {
    made.createEvent({
      id: sitUid(sit.id),
      sequence: sit.sequence,
      stamp: new Date(sit.updatedAt),
      created: new Date(sit.createdAt),
      lastModified: new Date(sit.updatedAt),
      start: new Date(sit.startAt),
      end: new Date(sit.endAt),
      status: sit.status === 'booked' ? ICalEventStatus.CONFIRMED : ICalEventStatus.CANCELLED,
      summary: plainLine(shown.summary),
      description: shown.description,
      location: locationOf(shown),
      ...(organizer ? { organizer: { ...organizer, name: parameterText(organizer.name) } } : {}),
      ...(attendee
        ? {
            attendees: [
              {
                name: parameterText(attendee.name),
                email: attendee.email,
                role: ICalAttendeeRole.REQ,
                status: ICalAttendeeStatus.ACCEPTED,
                rsvp: false,
              },
            ],
          }
        : {}),
    });
  }
  return made.toString();
}
