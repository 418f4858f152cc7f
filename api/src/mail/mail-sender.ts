import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable, Logger, type BeforeApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { Clock } from '../platform/clock/clock.js';
import { Configuration } from '../platform/configuration/configuration.js';
import { Secrets } from '../platform/secrets/secrets.js';
import { composeMail } from './mail-texts.js';
import { OutgoingMail } from './outgoing-mail.entity.js';

const LOOK_EVERY_MS = 15_000;
const SMTP_TIMEOUT_MS = 10_000;
/** While one server tries a mail, the others leave it alone for so long. */
const CLAIM_MS = 60_000;

/** Takes due mails from the table one by one and sends them; several servers may do so side by side. */
@Injectable()
export class MailSender implements OnModuleInit, BeforeApplicationShutdown {
  private readonly log = new Logger(MailSender.name);
  private readonly transport: Transporter;
  private timer: NodeJS.Timeout | undefined;
  private running: Promise<void> | undefined;
  private isAskedAgain = false;
  private isClosed = false;

  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    private readonly configuration: Configuration,
  ) {
    this.transport = createTransport({
      url: configuration.mailUrl,
      connectionTimeout: SMTP_TIMEOUT_MS,
      greetingTimeout: SMTP_TIMEOUT_MS,
      socketTimeout: SMTP_TIMEOUT_MS,
      disableFileAccess: true,
      disableUrlAccess: true,
    });
  }

  onModuleInit(): void {
    this.timer = setInterval(() => this.wake(), LOOK_EVERY_MS);
    this.timer.unref();
  }

  async beforeApplicationShutdown(): Promise<void> {
    this.isClosed = true;
    clearInterval(this.timer);
    await this.running;
    this.transport.close();
  }

  /** Starts a look through the table, or asks the one under way to look once more. */
  wake(): void {
    if (this.isClosed) return;
    if (this.running) {
      this.isAskedAgain = true;
      return;
    }
    this.running = this.sendDue()
      .catch((error: unknown) => this.log.error(`looking for mails failed: ${nameOf(error)}`))
      .finally(() => {
        this.running = undefined;
        if (!this.isAskedAgain) return;
        this.isAskedAgain = false;
        this.wake();
      });
  }

  private async sendDue(): Promise<void> {
    for (;;) {
      const em = this.em.fork();
      const mail = this.isClosed ? null : await this.claim(em);
      if (!mail) return;
      try {
        await this.send(mail);
        em.remove(mail);
      } catch (error) {
        mail.failed(this.clock.nowMs());
        // the error's text may hold the address; its name and code say enough
        this.log.warn(`a mail could not be sent, try ${mail.tries}: ${nameOf(error)}`);
      }
      await em.flush();
    }
  }

  /** The next due mail, put off for the others while it is tried here. */
  private async claim(em: EntityManager): Promise<OutgoingMail | null> {
    const nowMs = this.clock.nowMs();
    const rows = await em.getConnection().execute<{ id: string }[]>(
      `update outgoing_mail set next_try_at = ? where id = (
         select id from outgoing_mail where next_try_at <= ? order by next_try_at limit 1 for update skip locked
       ) returning id`,
      [nowMs + CLAIM_MS, nowMs],
    );
    return rows[0] ? em.findOne(OutgoingMail, { id: rows[0].id }) : null;
  }

  private async send(mail: OutgoingMail): Promise<void> {
    const token = this.secrets.mac('mail-token', mail.mailTokenId);
    const { subject, text, html } = composeMail(mail.kind, mail.toName, this.configuration.publicUrl, token);
    await this.transport.sendMail({
      from: this.configuration.mailFrom,
      to: { name: mail.toName, address: mail.toEmail },
      subject,
      text,
      html,
    });
  }
}

function nameOf(error: unknown): string {
  if (!(error instanceof Error)) return typeof error;
  const { code } = error as { code?: unknown };
  return typeof code === 'string' ? `${error.name} ${code}` : error.name;
}
