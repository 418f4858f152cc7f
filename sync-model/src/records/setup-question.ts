/** How long a setup is believed before the screen asks again (product.md, Field). */
export const SETUP_QUESTION_EVERY_MS = 30 * 60_000;

/** When and in which round the operator last said which setup is in use: by starting, by switching, by answering. */
export type SetupConfirmation = { setupId: string; atMs: number; roundNo: number };

/**
 * Whether "Still long wire?" is due: at each new round, and 30 minutes after it was last said. `switchedAtMs` is when
 * the outing's setup was written: it speaks where this phone remembers nothing of the setup in use, because another
 * phone switched to it, or this one died before it could note that it did.
 */
export function isSetupQuestionDue(
  confirmed: SetupConfirmation | null,
  now: { setupId: string; switchedAtMs: number; atMs: number; roundNo: number },
): boolean {
  if (confirmed?.setupId !== now.setupId) return now.atMs - now.switchedAtMs >= SETUP_QUESTION_EVERY_MS;
  if (now.roundNo > confirmed.roundNo) return true;
  return now.atMs - confirmed.atMs >= SETUP_QUESTION_EVERY_MS;
}
