import type { AddressInfo } from 'node:net';
import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export type CaughtMail = { readonly to: string; readonly raw: string; readonly parsed: ParsedMail };

/** A real SMTP server that keeps what it is given. */
export class MailCatcher {
  readonly mails: CaughtMail[] = [];
  /** Set to refuse every mail for a while. */
  isClosed = false;
  private readonly server: SMTPServer;

  constructor() {
    this.server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['AUTH', 'STARTTLS'],
      onMailFrom: (_address, _session, done) =>
        done(this.isClosed ? Object.assign(new Error('try later'), { responseCode: 451 }) : null),
      onData: (stream, session, done) => {
        const chunks: Buffer[] = [];
        stream.on('data', (chunk: Buffer) => chunks.push(chunk));
        stream.on('end', () => {
          const raw = Buffer.concat(chunks).toString('utf8');
          const to = session.envelope.rcptTo.map(({ address }) => address).join(',');
          void simpleParser(raw).then((parsed) => {
            this.mails.push({ to, raw, parsed });
            done();
          }, done);
        });
      },
    });
  }

  async start(): Promise<string> {
    await new Promise<void>((resolve) => this.server.listen(0, '127.0.0.1', resolve));
    const { port } = this.server.server.address() as AddressInfo;
    return `smtp://127.0.0.1:${port}`;
  }

  stop(): Promise<void> {
    return new Promise((resolve) => this.server.close(() => resolve()));
  }

  /** The newest mail to an address once there are `count` of them; fails after 5 s. */
  async mailTo(email: string, count = 1): Promise<CaughtMail> {
    for (const until = Date.now() + 5000; Date.now() < until; await pause(20)) {
      const mails = this.mails.filter(({ to }) => to === email);
      if (mails.length >= count) return mails[mails.length - 1]!;
    }
    throw new Error(`no mail number ${count} came to ${email}`);
  }
}

/** The token of the link in a mail, the same in its text and its HTML. */
export function linkTokenOf({ parsed }: CaughtMail, path: string): string {
  const pattern = new RegExp(`http://harkmoor\\.test${path}#token=([A-Za-z0-9_-]{43})`);
  const inText = pattern.exec(parsed.text ?? '')?.[1];
  const inHtml = pattern.exec(String(parsed.html))?.[1];
  if (!inText || inText !== inHtml) throw new Error(`the mail holds no link to ${path}`);
  return inText;
}

export function pause(ms: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
