/** The value of the largest size, with its sign; 0 of none. Never -0. */
export function largest(values: readonly number[]): number {
  return values.reduce((most, value) => (Math.abs(value) > Math.abs(most) ? value : most), 0) + 0;
}
