import { useEffect, useState } from 'react';
import type { LogChoices } from '../index/log-choices';
import type { LogClient } from './log-client';

/** What the log holds to choose from, read while it is needed; null before. */
export function useLogChoices(client: LogClient | null, isNeeded: boolean): LogChoices | null {
  const [choices, setChoices] = useState<LogChoices | null>(null);
  useEffect(() => {
    if (!client || !isNeeded) return;
    let isWanted = true;
    const ask = (): void => {
      client.ask({ type: 'choices' }).then(
        (answer) => isWanted && setChoices(answer),
        (error: unknown) => isWanted && console.error('the choices of the log could not be read', error),
      );
    };
    ask();
    const stop = client.onChange(ask);
    return () => {
      isWanted = false;
      stop();
    };
  }, [client, isNeeded]);
  return choices;
}
