type MapButtonsProps = {
  readonly onIn: () => void;
  readonly onOut: () => void;
  readonly onAll: () => void;
};

/** Zoom for one finger and for the keyboard, and the way back to all squares. */
export function MapButtons({ onIn, onOut, onAll }: MapButtonsProps) {
  return (
    <div className="cov-map-buttons" role="group" aria-label="Zoom">
      <button type="button" aria-label="Zoom in" onClick={onIn}>
        <Mark path="M10 4v12M4 10h12" />
      </button>
      <button type="button" aria-label="Zoom out" onClick={onOut}>
        <Mark path="M4 10h12" />
      </button>
      <button type="button" aria-label="Show all squares" onClick={onAll}>
        <Mark path="M4 8V4h4M12 4h4v4M16 12v4h-4M8 16H4v-4" />
      </button>
    </div>
  );
}

function Mark({ path }: { readonly path: string }) {
  return (
    <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
      <path d={path} fill="none" stroke="currentColor" strokeWidth="2.5" strokeLinecap="round" />
    </svg>
  );
}
