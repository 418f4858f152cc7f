import { Button } from '../../../design/button/Button';
import { Sheet } from '../../../design/sheet/Sheet';
import { timeOrDate } from '../../../platform/utc-text';

type EndSheetProps = {
  readonly lastEntryAt: number | null;
  readonly nowMs: number;
  readonly onEnd: (atMs: number) => void;
  readonly onClose: () => void;
};

/** Ends the outing now, or when it really ended. */
export function EndSheet({ lastEntryAt, nowMs, onEnd, onClose }: EndSheetProps) {
  return (
    <Sheet isOpen title="End the outing?" onClose={onClose}>
      <p>Its entries stay as they are, and you can still edit them in the logbook.</p>
      <div className="fd-sheet-list">
        <Button onClick={() => onEnd(Date.now())}>End it now</Button>
        {lastEntryAt === null ? null : (
          <Button look="outline" onClick={() => onEnd(lastEntryAt)}>
            It ended with the last entry, {timeOrDate(lastEntryAt, nowMs)} UTC
          </Button>
        )}
      </div>
    </Sheet>
  );
}
