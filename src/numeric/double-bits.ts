const buffer: ArrayBuffer = /* @__PURE__ */ new ArrayBuffer(8);
const view: DataView = /* @__PURE__ */ new DataView(buffer);

/** The upper 32 bits of a double as a signed integer: sign, exponent and the first 20 bits of the fraction. */
export function highWord(value: number): number {
  view.setFloat64(0, value, true);
  return view.getInt32(4, true);
}

/** 2^exponent as a double, for whole exponents from -1022 to 1023. */
export function powerOfTwo(exponent: number): number {
  view.setInt32(0, 0, true);
  view.setInt32(4, (exponent + 1023) << 20, true);
  return view.getFloat64(0, true);
}

/**
 * The number of bits of a BigInt above zero, given the double nearest to it. It may be one more where the number lies
 * just below a power of two.
 */
export function bitLength(value: bigint, nearest: number): number {
  if (nearest < Number.POSITIVE_INFINITY) return (highWord(nearest) >> 20) - 1022;
  const digits = value.toString(16);
  return digits.length * 4 - (Math.clz32(Number.parseInt(digits[0]!, 16)) - 28);
}
