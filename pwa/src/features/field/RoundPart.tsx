import { useIonRouter } from '@ionic/react';
import { ROUND_NO_MAX } from '@harkmoor/sync-model/records/round';
import { Button } from '../../design/button/Button';
import type { StoredReception } from './data/outing-entries';
import type { StoredTarget } from './data/outing-frame';
import { useGear } from './data/gear';
import { useFieldActions } from './data/use-field-actions';
import { padForEdit } from './pad-paths';
import { ListChoice } from './ui/ListChoice';
import { OtherEntries } from './ui/OtherEntries';
import { RoundHead } from './ui/OutingHead';
import { RowSheets } from './ui/RowSheets';
import { TargetRow } from './ui/TargetRow';
import { useAct } from './use-act';
import { useRowActs } from './use-row-acts';
import { useRowPaths } from './use-row-paths';
import type { RunningField } from './use-running-field';

type RoundPartProps = {
  readonly field: RunningField;
  readonly touchRows: () => void;
  readonly onEnd: () => void;
};

const ALWAYS_ON = { kind: 'on', until: null } as const;

/** The rows of the round, what was entered beside them, and the acts that close a round or the outing. */
export function RoundPart({ field, touchRows, onEnd }: RoundPartProps) {
  const { outing, frame, roundNo, round, trueMs, entries } = field;
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const gear = useGear() ?? [];
  const rows = useRowActs(outing, roundNo, touchRows);
  const rowPaths = useRowPaths(field);
  const setupLabel = (id: string): string =>
    [...frame.setups, ...gear].find((setup) => setup.id === id)?.label ?? 'setup';
  const onAirOf = (target: StoredTarget) => field.onAir.get(target.id) ?? ALWAYS_ON;
  const nameOf = (id: string | null) => frame.targets.find((target) => target.id === id)?.fields.name ?? null;
  const edit = (entry: StoredReception): void => router.push(padForEdit(entry.id));
  return (
    <>
      {round.total > 0 ? <RoundHead field={field} /> : <ListChoice outing={outing} list={frame.list} />}
      {round.total > 0 ? (
        <ul className="fd-rows" aria-label={`Round ${roundNo}`}>
          {round.rows.map((row) => (
            <TargetRow
              key={row.target.id}
              row={row}
              onAir={onAirOf(row.target)}
              isTriedAnyway={rows.triedAnyway.has(row.target.id)}
              path={rowPaths.get(row.target.id) ?? ''}
              setupLabel={row.entry ? setupLabel(row.entry.fields.setupId) : ''}
              nowMs={trueMs}
              acts={rows.rows}
            />
          ))}
        </ul>
      ) : null}
      <OtherEntries
        entries={entries.filter(({ fields }) => fields.roundNo === null)}
        setupLabel={setupLabel}
        targetName={nameOf}
        onEdit={edit}
      />
      <div className="fd-outing-acts">
        {round.total > 0 && roundNo < ROUND_NO_MAX ? (
          <Button
            look={round.isDone ? 'primary' : 'outline'}
            onClick={() => void act(() => actions.startRound(outing.id, roundNo + 1))}
          >
            New round
          </Button>
        ) : null}
        <Button look="outline" onClick={onEnd}>
          End outing
        </Button>
      </div>
      <RowSheets
        question={rows.question}
        onAir={onAirOf}
        nowMs={trueMs}
        isAnswered={(target) => round.rows.some((row) => row.target.id === target.id && row.entry !== null)}
        onNil={rows.nil}
        onSkip={rows.skip}
        onHeard={rows.hear}
        onClose={rows.closeQuestion}
      />
    </>
  );
}
