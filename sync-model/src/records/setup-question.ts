/** How long a setup is believed before the screen asks again (product.md, Field). */
export const SETUP_QUESTION_EVERY_MS = 30 * 60_000;

/** When and in which round the operator last said which setup is in use: by starting, by switching, by answering. */
export type SetupConfirmation = { setupId: string; atMs: number; roundNo: number };

/** Whether "Still long wire?" is due: at each new round, and 30 minutes after it was last said. */
export function isSetupQuestionDue(
  confirmed: SetupConfirmation,
  now: { setupId: string; atMs: number; roundNo: number },
): boolean {
  if (confirmed.setupId !== now.setupId) return false; // switched just now, here or on another phone
  if (now.roundNo > confirmed.roundNo) return true;
  return now.atMs - confirmed.atMs >= SETUP_QUESTION_EVERY_MS;
}
