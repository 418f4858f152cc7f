/** Whether the open club has a Desk for this person: organizers and admins. */
export function useMayUseDesk(): boolean {
  return false;
}
