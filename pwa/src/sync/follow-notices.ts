import type { OpenLog } from '../store/open-log';
import { listenForNotices, type Notice } from './notices';

/**
 * Asks for a round whenever a club has more than this phone has fetched. A notice that comes while no round may
 * begin waits for `follow`, which is called after each round.
 */
export function followNotices(
  log: OpenLog,
  accountId: string,
  isReady: () => boolean,
  askForRound: () => void,
): { follow(): void; stop(): void } {
  const noticed = new Map<string, number>();
  const askForNews = async (notices: readonly Notice[]) => {
    for (const notice of notices) if (await isNews(log, notice)) askForRound();
  };
  const follow = () => {
    if (!isReady()) return;
    const notices = [...noticed].map(([clubId, seq]) => ({ clubId, seq }));
    noticed.clear();
    // a notice that is lost here is made up for by the next ordinary round
    askForNews(notices).catch((error: unknown) => console.error('a notice could not be followed', error));
  };
  const listening = listenForNotices(accountId, ({ clubId, seq }) => {
    noticed.set(clubId, seq);
    follow();
  });
  addEventListener('online', listening.resume);
  return {
    follow,
    stop: () => {
      removeEventListener('online', listening.resume);
      listening.stop();
    },
  };
}

/** Whether the server holds more of a club than this phone has fetched; one that it does not know is fetched too. */
async function isNews({ database }: OpenLog, { clubId, seq }: Notice): Promise<boolean> {
  if (!database.isOpen()) return false;
  const club = await database.clubs.get(clubId);
  return !club || seq > club.cursor;
}
