/** The filter that leaves only the red channel of a picture, from its luminance (Rec. 709 weights). */
export function RedFilter() {
  return (
    <svg width="0" height="0" aria-hidden="true" className="red-filter">
      <filter id="red-only" colorInterpolationFilters="sRGB">
        <feColorMatrix values="0.2126 0.7152 0.0722 0 0  0 0 0 0 0  0 0 0 0 0  0 0 0 1 0" />
      </filter>
    </svg>
  );
}
