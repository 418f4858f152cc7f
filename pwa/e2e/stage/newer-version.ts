import http from 'node:http';
import { afterAll } from 'vitest';
import { APP } from './addresses';

/**
 * The application as from another server that gets a newer version when told so: everything is passed through, and the
 * worker's script differs by one line from then on. Ends with the journey.
 */
export async function serverWithNewerVersion(): Promise<{ address: string; release(): void }> {
  let isReleased = false;
  const server = http.createServer((request, response) => {
    void pass(request.url ?? '/', isReleased).then(
      ({ status, headers, body }) => response.writeHead(status, headers).end(body),
      () => response.writeHead(502).end(),
    );
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  afterAll(() => {
    server.closeAllConnections();
    server.close();
  });
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('the server has no port');
  return {
    address: `http://127.0.0.1:${address.port}`,
    release: () => {
      isReleased = true;
    },
  };
}

type Answer = { status: number; headers: Record<string, string>; body: Buffer };

async function pass(path: string, isReleased: boolean): Promise<Answer> {
  const answer = await fetch(APP + path);
  const body = Buffer.from(await answer.arrayBuffer());
  const headers = Object.fromEntries(
    [...answer.headers].filter(
      ([name]) => !/^(content-(encoding|length)|transfer-encoding|connection)$/.test(name),
    ),
  );
  const newer = isReleased && path === '/sw.js' ? Buffer.from('\n// newer\n') : Buffer.alloc(0);
  return { status: answer.status, headers, body: Buffer.concat([body, newer]) };
}
