/** Length in bytes of a text as UTF-8, without an encoder, which not every host of this package has. */
export function utf8Bytes(text: string): number {
  let bytes = 0;
  for (let i = 0; i < text.length; i += 1) {
    const unit = text.charCodeAt(i);
    if (unit < 0x80) bytes += 1;
    else if (unit < 0x800) bytes += 2;
    else if (unit >= 0xd800 && unit < 0xdc00 && i + 1 < text.length) {
      bytes += 4;
      i += 1;
    } else bytes += 3;
  }
  return bytes;
}

/** Whether a text is at most so long as UTF-8. No unit takes more than three bytes, so a short one is not counted. */
export function isWithinBytes(text: string, bytesMax: number): boolean {
  return text.length * 3 <= bytesMax || utf8Bytes(text) <= bytesMax;
}

/** Bytes of a value as JSON on the wire. */
export function jsonBytes(value: unknown): number {
  return utf8Bytes(JSON.stringify(value) ?? '');
}
