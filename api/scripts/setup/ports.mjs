import net from 'node:net';
import { PlainFailure } from './plain-failure.mjs';

const LOOPBACK = '127.0.0.1';

/** Resolves to a port of the loopback address that was free a moment ago. */
export function freePort() {
  return new Promise((resolve, reject) => {
    const server = net.createServer().once('error', reject);
    server.listen(0, LOOPBACK, () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

export function isPortFree(port) {
  return new Promise((resolve) => {
    const server = net.createServer().once('error', () => resolve(false));
    server.listen({ port, host: LOOPBACK, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** Reads PORT (default 3000; 0 takes any free one). Fails with a sentence when it is not a port or another program has it. */
export async function webPort(text = process.env.PORT) {
  const port = text === undefined || text === '' ? 3000 : Number(text);
  if (!Number.isInteger(port) || port < 0 || port > 65_535)
    throw new PlainFailure(`PORT is "${text}": set it to a whole number from 1 to 65535.`);
  if (port === 0) return freePort();
  if (!(await isPortFree(port)))
    throw new PlainFailure(
      `Port ${port} is in use by another program (or may not be used): set PORT to a free one, for example PORT=${port + 1} npm start.`,
    );
  return port;
}
