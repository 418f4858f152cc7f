import type { Knex } from '@mikro-orm/postgresql';

/** A statement with `$1` places. Its name lets PostgreSQL keep the plan for the life of the connection. */
export type Statement = { readonly name: string; readonly text: string };

/** Runs one bound statement in the transaction at hand. */
export type Query = <Row>(statement: Statement, values: readonly unknown[]) => Promise<Row[]>;

type RawConnection = {
  query(config: string | { name: string; text: string; values: unknown[] }): Promise<{ rows: unknown[] }>;
  end(): Promise<void>;
};

const SERIALIZATION_FAILURE = '40001';
const DEADLOCK_DETECTED = '40P01';
const ATTEMPTS_MAX = 5;
const RETRY_PAUSE_MS = 20;

/**
 * Runs `work` between `begin` and commit on a connection of its own. Any failure rolls everything back; where
 * PostgreSQL asks for another try (deadlock, serialization), `work` runs again, a few times at most, so it must
 * have no effect outside the transaction.
 */
export async function inTransaction<T>(
  knex: Knex,
  begin: string,
  work: (query: Query) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await attemptTransaction(knex, begin, work);
    } catch (error) {
      if (attempt === ATTEMPTS_MAX || !isWorthRetrying(error)) throw error;
      await pause(RETRY_PAUSE_MS * attempt * (1 + Math.random()));
    }
  }
}

async function attemptTransaction<T>(
  knex: Knex,
  begin: string,
  work: (query: Query) => Promise<T>,
): Promise<T> {
  const connection = (await knex.client.acquireConnection()) as RawConnection;
  try {
    await connection.query(begin);
    try {
      const result = await work(queryOn(connection));
      await connection.query('commit');
      return result;
    } catch (error) {
      await rollBack(connection);
      throw error;
    }
  } finally {
    await knex.client.releaseConnection(connection);
  }
}

function queryOn(connection: RawConnection): Query {
  return async <Row>({ name, text }: Statement, values: readonly unknown[]) => {
    const { rows } = await connection.query({ name, text, values: [...values] });
    return rows as Row[];
  };
}

/** A connection that cannot roll back is closed: the server then rolls back, and the pool drops it. */
async function rollBack(connection: RawConnection): Promise<void> {
  try {
    await connection.query('rollback');
  } catch {
    await connection.end().catch(() => undefined);
  }
}

function isWorthRetrying(error: unknown): boolean {
  const code = error instanceof Error && 'code' in error ? error.code : undefined;
  return code === SERIALIZATION_FAILURE || code === DEADLOCK_DETECTED;
}

function pause(ms: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
