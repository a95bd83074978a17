import { simpleParser } from 'mailparser';
import { SMTPServer, type SMTPServerOptions } from 'smtp-server';
import { afterEach, describe, expect, it } from 'vitest';
import { EXAMPLE_MESSAGE } from './example-message';
import { makeSmtpMail } from './smtp';

class Refusal extends Error {
  constructor(
    readonly responseCode: number,
    message: string,
  ) {
    super(message);
  }
}

const running: SMTPServer[] = [];

async function serve(options: SMTPServerOptions): Promise<string> {
  const server = new SMTPServer({ authOptional: true, disabledCommands: ['STARTTLS'], ...options });
  server.on('error', () => undefined);
  running.push(server);
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const at = server.server.address();
  return `127.0.0.1:${typeof at === 'object' && at ? at.port : 0}`;
}

afterEach(async () => {
  for (const server of running.splice(0)) await new Promise<void>((done) => server.close(done));
});

const sendTo = (url: string) => makeSmtpMail({ url, from: 'Windrest <windrest@club.test>' }).send(EXAMPLE_MESSAGE);

describe('SMTP against a real server on this machine', () => {
  it('delivers the message with its stable id and calendar', async () => {
    let raw = '';
    const host = await serve({
      onData(stream, _session, done) {
        stream.on('data', (bytes: Buffer) => {
          raw += bytes.toString('utf8');
        });
        stream.on('end', () => done());
      },
    });
    expect(await sendTo(`smtp://${host}`)).toEqual({ ok: true, messageId: '<mal_0123456789abcdef@club.test>' });
    const mail = await simpleParser(raw);
    expect(mail.messageId).toBe('<mal_0123456789abcdef@club.test>');
    expect(mail.subject).toBe(EXAMPLE_MESSAGE.subject);
    expect(mail.attachments.map((one) => one.contentType)).toContain('application/ics');
  });

  it.each([
    [550, true],
    [552, true],
    [450, false],
    [421, false],
  ])('reads a recipient refused with %i as permanent: %s', async (code, permanent) => {
    const host = await serve({ onRcptTo: (_to, _session, done) => done(new Refusal(code, 'not here')) });
    expect(await sendTo(`smtp://${host}`)).toMatchObject({ ok: false, permanent });
  });

  it.each([
    [554, true],
    [451, false],
  ])('reads a message refused with %i as permanent: %s', async (code, permanent) => {
    const host = await serve({
      onData(stream, _session, done) {
        stream.resume();
        stream.on('end', () => done(new Refusal(code, 'no')));
      },
    });
    expect(await sendTo(`smtp://${host}`)).toMatchObject({ ok: false, permanent });
  });

  it('keeps trying when the server does not know our password, and never repeats the password', async () => {
    const host = await serve({
      authOptional: false,
      allowInsecureAuth: true,
      onAuth: (_auth, _session, done) => done(new Refusal(535, 'who are you')),
    });
    const result = await sendTo(`smtp://windrest:very-secret@${host}`);
    expect(result).toMatchObject({ ok: false, permanent: false });
    expect(JSON.stringify(result)).not.toContain('very-secret');
  });

  it('keeps trying when nobody listens', async () => {
    const host = await serve({});
    const server = running.pop();
    await new Promise<void>((done) => (server ? server.close(done) : done()));
    expect(await sendTo(`smtp://${host}`)).toMatchObject({ ok: false, permanent: false });
  });
});
