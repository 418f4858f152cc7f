/** The name of the club whose log is open. */
export function ClubName() {
  return null;
}
