import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { z } from 'zod';

const wholeNumber = (min: number, max: number) => z.coerce.number().int().min(min).max(max);

const environmentSchema = z.object({
  PORT: wholeNumber(0, 65_535).default(3000),
  HOST: z.string().min(1).default('127.0.0.1'),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  /** Signs access tokens; the keys for other purposes are derived from it. */
  JWT_SECRET: z.string().min(32),
  MAIL_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().min(3).max(200).default('Harkmoor <harkmoor@localhost>'),
  /** Where people open the application: links in mails begin with it, and https makes cookies secure; its port names the cookie. */
  PUBLIC_URL: z.url({ protocol: /^https?$/ }),
  PWA_DIR: z.string().min(1).optional(),
  LOG_LEVEL: z.enum(['silent', 'fatal', 'error', 'warn', 'info', 'debug']).default('info'),
  /** How many reverse proxies stand in front; 0 means that X-Forwarded-For is not believed. */
  TRUSTED_PROXIES: wholeNumber(0, 10).default(0),
  REQUESTS_PER_MINUTE: wholeNumber(1, 10_000_000).default(1200),
  DATABASE_CONNECTIONS: wholeNumber(2, 500).default(10),
  /** Free tries of a password, an account and network together; then each waits twice as long. */
  SIGN_IN_TRIES: wholeNumber(1, 1_000_000).default(5),
  MAILS_PER_ADDRESS_PER_HOUR: wholeNumber(1, 1_000_000).default(5),
  MAILS_PER_NETWORK_PER_HOUR: wholeNumber(1, 1_000_000).default(60),
});

export type Environment = Readonly<Record<string, string | undefined>>;

/** Everything that the process is told from outside, checked once at its start. */
export class Configuration {
  readonly port: number;
  readonly host: string;
  readonly databaseUrl: string;
  readonly databaseConnections: number;
  readonly secret: string;
  readonly mailUrl: string;
  readonly mailFrom: string;
  /** Without a slash at its end. */
  readonly publicUrl: string;
  readonly pwaDir: string;
  readonly logLevel: string;
  readonly trustedProxies: number;
  readonly requestsPerMinute: number;
  readonly signInTries: number;
  readonly mailsPerAddressPerHour: number;
  readonly mailsPerNetworkPerHour: number;

  constructor(environment: z.infer<typeof environmentSchema>) {
    this.port = environment.PORT;
    this.host = environment.HOST;
    this.databaseUrl = environment.DATABASE_URL;
    this.databaseConnections = environment.DATABASE_CONNECTIONS;
    this.secret = environment.JWT_SECRET;
    this.mailUrl = environment.MAIL_URL;
    this.mailFrom = environment.MAIL_FROM;
    this.publicUrl = environment.PUBLIC_URL.replace(/\/+$/, '');
    this.pwaDir = environment.PWA_DIR ?? join(projectRoot(), 'pwa/dist');
    this.logLevel = environment.LOG_LEVEL;
    this.trustedProxies = environment.TRUSTED_PROXIES;
    this.requestsPerMinute = environment.REQUESTS_PER_MINUTE;
    this.signInTries = environment.SIGN_IN_TRIES;
    this.mailsPerAddressPerHour = environment.MAILS_PER_ADDRESS_PER_HOUR;
    this.mailsPerNetworkPerHour = environment.MAILS_PER_NETWORK_PER_HOUR;
  }

  get isHttps(): boolean {
    return this.publicUrl.startsWith('https:');
  }

  /** The port that people's browsers see, also where the address leaves it out. */
  get publicPort(): number {
    const { port } = new URL(this.publicUrl);
    return port === '' ? (this.isHttps ? 443 : 80) : Number(port);
  }
}

/** Reads the configuration from environment variables; throws one readable message that names all that is wrong. */
export function loadConfiguration(environment: Environment): Configuration {
  // an empty variable is one that somebody cleared
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const checked = environmentSchema.safeParse(given);
  if (checked.success) return new Configuration(checked.data);
  // values are not printed: they may be secrets
  const lines = checked.error.issues.map((issue) => {
    const name = issue.path.join('.');
    return `  ${name}: ${given[name] === undefined ? 'is not set' : issue.message}`;
  });
  throw new Error(`The configuration is not usable:\n${lines.join('\n')}`);
}

/** The folder that holds api/ and pwa/, the same from source and from dist. */
function projectRoot(): string {
  let folder = import.meta.dirname;
  while (!existsSync(join(folder, 'package-lock.json'))) {
    if (dirname(folder) === folder) return process.cwd();
    folder = dirname(folder);
  }
  return folder;
}
