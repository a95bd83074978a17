import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export interface TestSmtp {
  url: string;
  /** In the order of arrival, as an independent parser reads them. */
  mails: ParsedMail[];
  close: () => Promise<void>;
}

/** A real mail server on a free port that keeps what it is given. `onMail` runs before the sender is told that it arrived. */
export async function serveSmtp(onMail: (mail: ParsedMail) => void = () => undefined): Promise<TestSmtp> {
  const mails: ParsedMail[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      simpleParser(stream).then((mail) => {
        mails.push(mail);
        onMail(mail);
        done();
      }, done);
    },
  });
  // A client that is killed while it sends ends its connection: that is the client's trouble.
  server.on('error', () => undefined);
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const address = server.server.address();
  if (typeof address !== 'object' || !address) throw new Error('The mail server has no port.');
  return {
    url: `smtp://127.0.0.1:${address.port}`,
    mails,
    close: () => new Promise<void>((done) => server.close(() => done())),
  };
}
