import { useState } from 'react';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { SETUPS_PER_OUTING_MAX } from '@harkmoor/sync-model/records/outing-from-start';
import { Button } from '../../../design/button/Button';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { Sheet } from '../../../design/sheet/Sheet';
import { paths } from '../../../platform/paths';
import { utcHourMinute } from '../../../platform/utc-text';
import type { SetupChoice } from '../data/gear';
import type { StoredReception } from '../data/outing-entries';
import { withLabels } from '../setup-labels';

type SetupSheetProps = {
  readonly taken: readonly SetupChoice[];
  /** All setups on this phone. */
  readonly gear: readonly SetupChoice[];
  readonly currentSetupId: string;
  readonly entries: readonly StoredReception[];
  /** Entries from now carry it; it joins the outing where it was not taken along. */
  readonly onUse: (setupId: string) => void;
  readonly onMend: (sinceMs: number, setupId: string) => void;
  readonly onClose: () => void;
};

const ENTRIES_OFFERED = 8;

/** The setup from now on, *Change for entries since…* for a run that names the wrong one, and more setups. */
export function SetupSheet(props: SetupSheetProps) {
  const { taken, currentSetupId } = props;
  return (
    <Sheet isOpen title="Setups" onClose={props.onClose}>
      {taken.length > 1 ? (
        <ChoiceChips
          label="From now on"
          options={taken.map(({ id, label }) => ({ value: id, label }))}
          value={currentSetupId}
          onChange={(id) => id !== null && props.onUse(id)}
        />
      ) : null}
      <Mend {...props} />
      <TakeAlong {...props} />
    </Sheet>
  );
}

function TakeAlong({ taken, gear, onUse }: SetupSheetProps) {
  const others = withLabels(
    gear.filter(({ id, isOffered }) => isOffered && !taken.some((one) => one.id === id)),
    2,
  );
  const keys = (isOwn: boolean) =>
    others
      .filter((setup) => setup.isOwn === isOwn)
      .map(({ id, label }) => (
        <Button key={id} look="outline" onClick={() => onUse(id)}>
          {label}
        </Button>
      ));
  const own = keys(true);
  const shared = keys(false);
  const head = <h3 className="fd-sheet-head">Take another along</h3>;
  if (taken.length >= SETUPS_PER_OUTING_MAX) {
    return (
      <>
        {head}
        <p className="soft">An outing takes six setups along. This one has them.</p>
      </>
    );
  }
  return (
    <>
      {head}
      {own.length > 0 ? <div className="fd-sheet-list">{own}</div> : null}
      {shared.length > 0 ? (
        <details className="fd-more">
          <summary>With gear of others · {shared.length}</summary>
          <div className="fd-sheet-list">{shared}</div>
        </details>
      ) : null}
      <ButtonLink to={paths.newSetup()} look="quiet">
        Make a new setup
      </ButtonLink>
    </>
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
          label: `${utcHourMinute(fields.deviceAt)} · ${frequencyText(fields.tuning.dialHz)}`,
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
