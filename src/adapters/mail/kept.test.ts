import ical from 'ical.js';
import { simpleParser } from 'mailparser';
import { describe, expect, it } from 'vitest';
import { EXAMPLE_MESSAGE } from './example-message';
import { type KeptMessage, makeKeptMail } from './kept';

async function keepOne(message = EXAMPLE_MESSAGE): Promise<KeptMessage> {
  const kept: KeptMessage[] = [];
  const port = makeKeptMail('Windrest <windrest@club.test>', async (one) => {
    kept.push(one);
  });
  expect(await port.send(message)).toEqual({ ok: true, messageId: '<mal_0123456789abcdef@club.test>' });
  const [only] = kept;
  if (!only) throw new Error('nothing was kept');
  return only;
}

describe('kept mail', () => {
  it('writes a message that another parser reads whole', async () => {
    const { raw } = await keepOne();
    const mail = await simpleParser(raw);
    expect(mail.messageId).toBe('<mal_0123456789abcdef@club.test>');
    expect(mail.subject).toBe(EXAMPLE_MESSAGE.subject);
    expect(mail.text?.trim()).toBe(EXAMPLE_MESSAGE.text);
    expect(mail.html).toBe(EXAMPLE_MESSAGE.html);
    expect(mail.to).toMatchObject({ value: [{ address: 'orrin@example.test', name: 'Orrin Ström' }] });
    expect(mail.headers.get('auto-submitted')).toBe('auto-generated');
    expect(raw).toContain('List-Unsubscribe: <http://127.0.0.1:3000/account>');
  });

  it('carries the calendar as RFC 6047 asks: text/calendar with its method, readable by ical.js', async () => {
    const { raw } = await keepOne();
    expect(raw).toMatch(/Content-Type: text\/calendar; charset=utf-8; method=REQUEST/i);
    const mail = await simpleParser(raw);
    const part = mail.attachments.find((one) => one.contentType === 'application/ics');
    const event = new ical.Component(ical.parse(part?.content.toString('utf8') ?? '')).getFirstSubcomponent('vevent');
    expect(event?.getFirstPropertyValue('summary')).toBe('Sit at Oak Flat');
  });

  it('lets no line break in a name or subject make a header', async () => {
    const { raw } = await keepOne({
      ...EXAMPLE_MESSAGE,
      subject: 'Hello\r\nBcc: someone@example.test',
      to: { email: 'orrin@example.test', name: 'Orrin\r\nBcc: someone@example.test' },
    });
    expect((await simpleParser(raw)).bcc).toBeUndefined();
    expect(raw).not.toMatch(/^Bcc:/im);
  });

  it('says so when the message could not be kept', async () => {
    const port = makeKeptMail('windrest@club.test', () => Promise.reject(new Error('disk full')));
    expect(await port.send(EXAMPLE_MESSAGE)).toEqual({ ok: false, permanent: false, message: 'disk full' });
  });
});
