import './rain-lock.css';

/** One tap locks the screen against rain: on Field, and where drops would do the most harm, on the pad and the keys. */
export function LockKey({ onLock }: { readonly onLock: () => void }) {
  return (
    <button type="button" className="fd-lock" onClick={onLock} aria-label="Lock the screen against rain">
      <svg width="18" height="20" viewBox="0 0 18 20" aria-hidden="true">
        <path
          d="M4.5 9V6a4.500 4.500 0 0 1 9 0v3M2.500 9h13v9.500h-13z"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
          strokeLinejoin="round"
        />
      </svg>
      Lock
    </button>
  );
}
