import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { Sheet } from '../../../design/sheet/Sheet';
import { paths } from '../../../platform/paths';
import { utcHourMinute } from '../../../platform/utc-text';
import type { SetupChoice } from '../data/gear';
import type { StoredReception } from '../data/outing-entries';

type SetupSheetProps = {
  readonly taken: readonly SetupChoice[];
  /** All setups on this phone that are in use. */
  readonly gear: readonly SetupChoice[];
  readonly currentSetupId: string;
  readonly entries: readonly StoredReception[];
  readonly onAdd: (setupId: string) => void;
  readonly onMend: (sinceMs: number, setupId: string) => void;
  readonly onClose: () => void;
};

const SETUPS_MAX = 6;
const ENTRIES_OFFERED = 8;

/** More setups for this outing, and *Change for entries since…* for a run that names the wrong one. */
export function SetupSheet(props: SetupSheetProps) {
  const { taken, gear } = props;
  const others = gear.filter(({ id, isRetired }) => !isRetired && !taken.some((one) => one.id === id));
  const isFull = taken.length >= SETUPS_MAX;
  return (
    <Sheet isOpen title="Setups" onClose={props.onClose}>
      <h3 className="fd-sheet-head">Take another along</h3>
      {isFull ? <p className="soft">An outing takes six setups along. This one has them.</p> : null}
      <div className="fd-sheet-list">
        {isFull
          ? null
          : others.map((setup) => (
              <Button key={setup.id} look="outline" onClick={() => props.onAdd(setup.id)}>
                {setup.antennaName} · {setup.receiverName}
              </Button>
            ))}
        <ButtonLink to={paths.newSetup()} look="quiet">
          Make a new setup
        </ButtonLink>
      </div>
      <Mend {...props} />
    </Sheet>
  );
}

function Mend({ taken, currentSetupId, entries, onMend }: SetupSheetProps) {
  const offered = entries.slice(-ENTRIES_OFFERED).reverse();
  const [sinceMs, setSinceMs] = useState<number | null>(null);
  const [setupId, setSetupId] = useState(currentSetupId);
  if (offered.length === 0) return null;
  const count = entries.filter(
    ({ fields }) =>
      sinceMs !== null && fields.deviceAt >= sinceMs && fields.setupId !== setupId && !fields.swap,
  ).length;
  return (
    <>
      <h3 className="fd-sheet-head">Change for entries since…</h3>
      <ChoiceChips
        label="Since"
        options={offered.map(({ fields }) => ({
          value: String(fields.deviceAt),
          label: utcHourMinute(fields.deviceAt),
        }))}
        value={sinceMs === null ? null : String(sinceMs)}
        onChange={(value) => setSinceMs(value === null ? null : Number(value))}
      />
      <ChoiceChips
        label="They were heard with"
        options={taken.map(({ id, label }) => ({ value: id, label }))}
        value={setupId}
        onChange={(value) => value !== null && setSetupId(value)}
      />
      <Button
        disabled={sinceMs === null || count === 0}
        onClick={() => sinceMs !== null && onMend(sinceMs, setupId)}
      >
        {sinceMs === null
          ? 'Choose since when'
          : count === 0
            ? 'Nothing to change'
            : `Change ${count} ${count === 1 ? 'entry' : 'entries'}`}
      </Button>
    </>
  );
}
