import type { MailMessage } from './port';

/** A mail with every part, for the tests of the adapters. */
export const EXAMPLE_MESSAGE: MailMessage = {
  id: 'mal_0123456789abcdef',
  to: { email: 'orrin@example.test', name: 'Orrin Ström' },
  subject: 'Oak Flat is yours — evening of Nov 7',
  text: 'You sit at Oak Flat.\n\nhttp://127.0.0.1:3000/clubs/example',
  html: '<p>You sit at <b>Oak Flat</b>.</p>',
  calendar: {
    method: 'REQUEST',
    content: [
      'BEGIN:VCALENDAR',
      'VERSION:2.0',
      'PRODID:-//Windrest//EN',
      'METHOD:REQUEST',
      'BEGIN:VEVENT',
      'UID:sit_1@windrest',
      'DTSTAMP:20261101T120000Z',
      'DTSTART:20261107T200000Z',
      'SUMMARY:Sit at Oak Flat',
      'END:VEVENT',
      'END:VCALENDAR',
      '',
    ].join('\r\n'),
  },
  headers: { 'List-Unsubscribe': '<http://127.0.0.1:3000/account>' },
};
