import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { text } from 'node:stream/consumers';
import { createGunzip, gzipSync } from 'node:zlib';
import type { MikroORM } from '@mikro-orm/postgresql';
import type { Change } from '@harkmoor/sync-model/protocol/messages';

const TABLE = `create table if not exists bound_reception (
  club_id uuid not null, id uuid not null, seq bigint not null, at text not null, fields jsonb not null,
  primary key (club_id, id), unique (club_id, seq))`;
const INSERT = `insert into bound_reception (club_id, id, seq, at, fields)
  select ?, r.id, row_number() over (), r.at, r.fields
  from jsonb_to_recordset(?::jsonb) as r(id uuid, at text, fields jsonb)`;

/**
 * What no sync can beat here: one gzip request and one set-based insert of the same records into a table with a
 * primary key and a feed index; no rights, no checks, no merge. Milliseconds.
 */
export async function lowerBoundMs(
  orm: MikroORM,
  clubId: string,
  changes: readonly Change[],
): Promise<number> {
  const connection = orm.em.getConnection();
  await connection.execute(TABLE);
  await connection.execute('truncate bound_reception');
  const server = createServer((request, response) => {
    text(request.pipe(createGunzip()))
      .then((body) => connection.execute(INSERT, [clubId, JSON.stringify(JSON.parse(body))]))
      .then(
        () => response.end('{}'),
        (error: unknown) => response.writeHead(500).end(String(error)),
      );
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  try {
    const { port } = server.address() as AddressInfo;
    const started = performance.now();
    const body = gzipSync(JSON.stringify(changes), { level: 1 });
    const answer = await fetch(`http://127.0.0.1:${port}/`, { method: 'POST', body });
    if (!answer.ok) throw new Error(await answer.text());
    return performance.now() - started;
  } finally {
    server.close();
  }
}
