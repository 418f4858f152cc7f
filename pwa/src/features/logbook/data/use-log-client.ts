import { useIonViewDidEnter, useIonViewWillLeave } from '@ionic/react';
import { useEffect, useState } from 'react';
import { useActiveLog } from '../../../store/active-log';
import { openLogClient, type LogClient } from './log-client';

/** The list of the club that is shown; null before it is opened. Opened once, and closed with the page. */
export function useLogClient(): LogClient | null {
  const log = useActiveLog();
  const databaseName = log.database.name;
  const { clubId } = log;
  const region = log.card.ituRegion;
  const ownId = log.account?.id ?? null;
  const [client, setClient] = useState<LogClient | null>(null);
  useEffect(() => {
    const opened = openLogClient({ databaseName, clubId, region, ownId });
    setClient(opened);
    return () => {
      setClient(null);
      opened.close();
    };
  }, [databaseName, clubId, region, ownId]);
  useIonViewDidEnter(() => client?.watch(true), [client]);
  useIonViewWillLeave(() => client?.watch(false), [client]);
  return client;
}
