import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { Caution } from '../../../design/states/Caution';
import './cautions.css';

/** The reminders before an outing; local codes and licensed practice come first. */
export function Cautions() {
  const [isRead, setRead] = useState(false);
  if (isRead) return null;
  return (
    <Caution title="Before you set up" onDismiss={() => setRead(true)}>
      <CautionWords />
    </Caution>
  );
}

/** The same in a running outing, folded into one line, until it is put away for this outing. */
export function CautionLine({ onRead }: { readonly onRead: () => void }) {
  return (
    <details className="fd-caution">
      <summary>
        <b aria-hidden="true">△</b> Before you set up: cautions
      </summary>
      <CautionWords />
      <Button look="outline" onClick={onRead}>
        Understood
      </Button>
    </details>
  );
}

function CautionWords() {
  return (
    <>
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
    </>
  );
}
