import { Caution } from '../../../design/states/Caution';

/** The reminders at the start of an outing; local codes and licensed practice come first. */
export function Cautions({ onDismiss }: { readonly onDismiss?: () => void }) {
  return (
    <Caution title="Before you set up" onDismiss={onDismiss}>
      <ul>
        <li>Keep wires and masts well away from power lines.</li>
        <li>Thunder near: stop, and disconnect the antenna.</li>
        <li>An improvised earth never touches the mains.</li>
        <li>Mind heights and trees, traffic and tides, cold and heat.</li>
        <li>Headphones quietly; ask before you use other people’s land.</li>
      </ul>
      <p>
        Listening to some transmissions, or passing them on, is restricted in many countries: follow local law
        and licence terms. Reminders only; not for safety-of-life use.
      </p>
    </Caution>
  );
}
