import { useIonViewDidEnter, useIonViewWillLeave } from '@ionic/react';
import { useEffect, useState } from 'react';
import { useActiveLog } from '../../../store/active-log';
import type { AnswerTo, Question } from '../answers/questions';
import { openEvidenceClient, type EvidenceClient } from './evidence-client';

export type AnswerState<A> =
  | { readonly kind: 'reading' }
  /** `isCurrent` is false while the answer to a newer question is on its way: the older one stays on the screen. */
  | { readonly kind: 'ready'; readonly answer: A; readonly isCurrent: boolean }
  | { readonly kind: 'failed'; readonly message: string };

let open: { readonly key: string; readonly client: EvidenceClient } | null = null;
/** Screens of this feature that are in sight: pages stay mounted when they are left. */
let inSight = 0;

/** The evidence of the club that is shown: one count for all screens, closed when another club is opened. */
export function useEvidence(): EvidenceClient {
  const log = useActiveLog();
  const key = `${log.database.name}/${log.clubId}/${log.card.ituRegion}`;
  return clientFor(key, () =>
    openEvidenceClient({
      databaseName: log.database.name,
      clubId: log.clubId,
      region: log.card.ituRegion,
    }),
  );
}

function clientFor(key: string, make: () => EvidenceClient): EvidenceClient {
  if (open?.key !== key) {
    open?.client.close();
    open = { key, client: make() };
  }
  return open.client;
}

/** Has the club counted again after writes for as long as the calling screen is in sight. */
export function useWatchEvidence(): void {
  const client = useEvidence();
  const [isShown, setShown] = useState(true);
  useIonViewDidEnter(() => setShown(true));
  useIonViewWillLeave(() => setShown(false));
  useEffect(() => {
    if (!isShown) return;
    inSight += 1;
    client.watch(true);
    return () => {
      inSight -= 1;
      if (inSight === 0) client.watch(false);
    };
  }, [client, isShown]);
}

/** The answer to a question, kept current while records change; a null question is not asked. */
export function useAnswer<Q extends Question>(question: Q | null): AnswerState<AnswerTo<Q>> {
  const client = useEvidence();
  const asked = question && JSON.stringify(question);
  const [counted, setCounted] = useState(0);
  const [told, setTold] = useState<{ asked: string | null; state: AnswerState<AnswerTo<Q>> }>({
    asked: null,
    state: { kind: 'reading' },
  });
  useEffect(() => client.onCounted(() => setCounted((count) => count + 1)), [client]);
  useEffect(() => {
    if (asked === null) return;
    let isWanted = true;
    client.ask(JSON.parse(asked) as Q).then(
      (answer) =>
        isWanted &&
        setTold({ asked, state: { kind: 'ready', answer: answer as AnswerTo<Q>, isCurrent: true } }),
      (error: unknown) =>
        isWanted &&
        setTold({
          asked,
          state: { kind: 'failed', message: error instanceof Error ? error.message : String(error) },
        }),
    );
    return () => {
      isWanted = false;
    };
  }, [client, asked, counted]);
  if (told.state.kind === 'ready' && told.asked !== asked) return { ...told.state, isCurrent: false };
  return told.state;
}
