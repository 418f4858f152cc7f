import { Injectable } from '@nestjs/common';
import { Configuration } from '../platform/configuration/configuration.js';
import type { Refusal } from '../platform/errors/refusal.js';
import { Attempts } from '../platform/attempts/attempts.js';

/** How many mails may be caused from one network, and sent to one address, in an hour. */
@Injectable()
export class MailAllowance {
  constructor(
    private readonly attempts: Attempts,
    private readonly configuration: Configuration,
  ) {}

  ofNetwork(network: string): Promise<Refusal | null> {
    return this.attempts.take(['mail-from', network], {
      kind: 'window',
      free: this.configuration.mailsPerNetworkPerHour,
    });
  }

  /** The refusal must not be told: it would say that the address is known. */
  ofAddress(email: string): Promise<Refusal | null> {
    return this.attempts.take(['mail-to', email], {
      kind: 'window',
      free: this.configuration.mailsPerAddressPerHour,
    });
  }
}
