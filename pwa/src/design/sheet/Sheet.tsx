import { useEffect, useId, useRef, type ReactNode, type SyntheticEvent } from 'react';
import { useIonViewWillLeave } from '@ionic/react';
import './sheet.css';

type SheetProps = {
  readonly isOpen: boolean;
  readonly title: string;
  /** Asked by the close key, Escape, the phone's own back and a tap beside the sheet. */
  readonly onClose: () => void;
  /** Stays in sight below the scrolling content. */
  readonly foot?: ReactNode;
  readonly children: ReactNode;
};

/**
 * A sheet from the bottom of a phone, a window in the middle of a laptop. It is the browser's own modal dialog: it
 * holds the focus, gives it back, and closes by the phone's back gesture. Its content is made anew at each opening.
 */
export function Sheet(props: SheetProps) {
  useIonViewWillLeave(() => {
    if (props.isOpen) props.onClose();
  }, [props.isOpen, props.onClose]);
  return props.isOpen ? <OpenSheet {...props} /> : null;
}

function OpenSheet({ title, onClose, foot, children }: SheetProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    const before = document.activeElement;
    if (element && !element.open) element.showModal();
    heading.current?.focus();
    return () => {
      element?.close();
      if (before instanceof HTMLElement && before.isConnected) before.focus();
    };
  }, []);
  const cancel = (event: SyntheticEvent): void => {
    event.preventDefault();
    onClose();
  };
  return (
    <dialog
      ref={dialog}
      className="hm-sheet"
      aria-labelledby={titleId}
      onCancel={cancel}
      onClick={(event) => event.target === dialog.current && onClose()}
    >
      <div className="hm-sheet-body">
        <div className="hm-sheet-head">
          <h2 id={titleId} ref={heading} tabIndex={-1}>
            {title}
          </h2>
          <button type="button" className="hm-sheet-close" aria-label="Close" onClick={onClose}>
            <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
              <path d="M4 4l12 12M16 4L4 16" stroke="currentColor" strokeWidth="2.5" strokeLinecap="round" />
            </svg>
          </button>
        </div>
        <div className="hm-sheet-content">{children}</div>
        {foot ? <div className="hm-sheet-foot">{foot}</div> : null}
      </div>
    </dialog>
  );
}
