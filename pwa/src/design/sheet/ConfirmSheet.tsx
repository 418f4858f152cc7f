import type { ReactNode } from 'react';
import { Button } from '../button/Button';
import { Sheet } from './Sheet';

type ConfirmSheetProps = {
  readonly isOpen: boolean;
  /** The question, in words that name what will happen. */
  readonly title: string;
  /** What becomes of the records, and whether it can be taken back. */
  readonly children: ReactNode;
  /** Names the act: "Move to the bin", never "OK". */
  readonly confirmLabel: string;
  readonly cancelLabel?: string;
  readonly danger?: boolean;
  readonly busy?: boolean;
  readonly onConfirm: () => void;
  readonly onClose: () => void;
};

/** Asks before an act that cannot be undone with one tap. */
export function ConfirmSheet(props: ConfirmSheetProps) {
  return (
    <Sheet
      isOpen={props.isOpen}
      title={props.title}
      onClose={props.onClose}
      foot={
        <div className="hm-sheet-acts">
          <Button look="outline" onClick={props.onClose}>
            {props.cancelLabel ?? 'Keep as it is'}
          </Button>
          <Button look={props.danger ? 'danger' : 'primary'} busy={props.busy} onClick={props.onConfirm}>
            {props.confirmLabel}
          </Button>
        </div>
      }
    >
      {props.children}
    </Sheet>
  );
}
