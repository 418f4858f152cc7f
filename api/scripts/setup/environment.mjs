import { signingSecret } from './data-folder.mjs';

/** All that the API is told about this machine, as environment variables. */
export function apiEnvironment({ dataFolder, databaseUrl, port, publicUrl, smtpPort, mode }) {
  return {
    NODE_ENV: mode,
    HOST: '127.0.0.1',
    PORT: String(port),
    PUBLIC_URL: publicUrl,
    DATABASE_URL: databaseUrl,
    JWT_SECRET: signingSecret(dataFolder),
    MAIL_URL: `smtp://127.0.0.1:${smtpPort}`,
    MAIL_FROM: 'Harkmoor <post@harkmoor.example>',
    HARKMOOR_DATA: dataFolder,
  };
}
