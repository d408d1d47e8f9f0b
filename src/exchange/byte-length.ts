/** Bytes of a text in UTF-8; a lone surrogate counts as the three bytes of the replacement character. */
export function byteLength(text: string): number {
  let bytes = text.length;
  for (let index = 0; index < text.length; index += 1) {
    const code = text.charCodeAt(index);
    if (code < 0x80) continue;
    if (code < 0x800) {
      bytes += 1;
    } else if (isHighSurrogate(code) && isLowSurrogate(text.charCodeAt(index + 1))) {
      // Two units of UTF-16 make four bytes.
      bytes += 2;
      index += 1;
    } else {
      bytes += 2;
    }
  }
  return bytes;
}

function isHighSurrogate(code: number): boolean {
  return code >= 0xd800 && code <= 0xdbff;
}

function isLowSurrogate(code: number): boolean {
  return code >= 0xdc00 && code <= 0xdfff;
}
