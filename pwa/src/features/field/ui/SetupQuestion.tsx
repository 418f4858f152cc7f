type SetupQuestionProps = { readonly label: string; readonly onYes: () => void; readonly onNo: () => void };

/** "Still long wire?": one line, answered by one tap. */
export function SetupQuestion({ label, onYes, onNo }: SetupQuestionProps) {
  return (
    <div className="hm-notice" role="group" aria-label={`Still ${label}?`}>
      <span className="hm-notice-text">Still {label}?</span>
      <button type="button" onClick={onYes}>
        Yes
      </button>
      <button type="button" onClick={onNo}>
        Change
      </button>
    </div>
  );
}
