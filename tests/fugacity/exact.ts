import { Decimal as Shared } from "decimal.js";

/** Decimals of 30 digits, apart from the shared constructor. */
export const Decimal: typeof Shared = Shared.clone({ precision: 30, defaults: true });

/** The exact value of a double; `new Decimal(x)` would take its shortest decimal. */
export function exact(x: number): Shared {
  let mantissa = x;
  let halvings = 0;
  while (!Number.isInteger(mantissa)) {
    mantissa *= 2;
    halvings += 1;
  }
  return new Decimal(BigInt(mantissa).toString()).div(new Decimal(2).pow(halvings));
}
