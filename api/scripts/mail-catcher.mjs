// Takes every mail that Harkmoor sends on this machine and shows it in the browser; nothing leaves the machine.
// MAIL_SMTP_PORT and MAIL_WEB_PORT set the ports; without them any free ones are taken.
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { Inbox } from './mail-catcher/inbox.mjs';
import { makeWebServer } from './mail-catcher/web.mjs';

const LOOPBACK = '127.0.0.1';
const MAIL_SIZE_MAX_BYTES = 10_000_000;
const inbox = new Inbox();

const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS', 'AUTH'],
  size: MAIL_SIZE_MAX_BYTES,
  disableReverseLookup: true,
  onData(stream, session, done) {
    const recipients = session.envelope.rcptTo.map(({ address }) => address);
    simpleParser(stream).then(
      (parsed) => {
        inbox.add(parsed, recipients, new Date().toISOString());
        done();
      },
      (error) => done(error),
    );
  },
});
const web = makeWebServer(inbox);

process.on('disconnect', () => process.exit(0));
for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) process.on(signal, () => process.exit(0));
smtp.on('error', (error) => console.error(`mail catcher: ${error.message}`));

await new Promise((resolve) => smtp.listen(Number(process.env.MAIL_SMTP_PORT ?? 0), LOOPBACK, resolve));
await new Promise((resolve) => web.listen(Number(process.env.MAIL_WEB_PORT ?? 0), LOOPBACK, resolve));
const smtpPort = smtp.server.address().port;
const webPort = web.address().port;

if (process.send) process.send({ smtpPort, webPort });
else console.log(`Mail to smtp://${LOOPBACK}:${smtpPort}, read at http://${LOOPBACK}:${webPort}`);
