/**
 * The contrast ratio of two colours, 1 to 21, by WCAG 2.2 ("relative luminance" and "contrast ratio"). Colours as
 * `#rrggbb` or `rgb(r, g, b)`.
 */
export function contrastRatio(one: string, other: string): number {
  const [a, b] = [relativeLuminance(one), relativeLuminance(other)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

/** The channels of a colour, 0 to 255. */
export function channelsOf(colour: string): readonly [number, number, number] {
  const hex = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(colour);
  if (hex) return [parseInt(hex[1] ?? '', 16), parseInt(hex[2] ?? '', 16), parseInt(hex[3] ?? '', 16)];
  const rgb = /^rgb\((\d+),? (\d+),? (\d+)/.exec(colour);
  if (rgb) return [Number(rgb[1]), Number(rgb[2]), Number(rgb[3])];
  throw new Error(`not a colour that can be measured: ${colour}`);
}

function relativeLuminance(colour: string): number {
  const [r, g, b] = channelsOf(colour).map((channel) => {
    const share = channel / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * (r ?? 0) + 0.7152 * (g ?? 0) + 0.0722 * (b ?? 0);
}
