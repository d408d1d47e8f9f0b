import type { Constant } from "./constant.js";
import { faradayConstant, gasConstant } from "./constants.js";

/** Years of the CODATA adjustments of the constants whose molar gas constant is kept. */
export type GasConstantYear = 1963 | 1973 | 1986 | 1998 | 2002 | 2006 | 2010 | 2014 | 2018 | 2022;

/** Years of the CODATA adjustments of the constants whose Faraday constant is kept. */
export type FaradayConstantYear = Exclude<GasConstantYear, 1963>;

/**
 * Molar gas constant by the year of the CODATA adjustment, for reading tables made with it. From 2018 on exact.
 *
 * @see `references.cohen1965` to `references.tiesinga2021`
 * @example
 * gasConstantByAdjustment[1986].value; // => 8.31451
 */
export const gasConstantByAdjustment: Readonly<Record<GasConstantYear, Constant>> = /* @__PURE__ */ Object.freeze({
  1963: measured(8.3143, "J/mol/K", "cohen1965"),
  1973: measured(8.31441, "J/mol/K", "cohen1973"),
  1986: measured(8.31451, "J/mol/K", "cohen1987"),
  1998: measured(8.314472, "J/mol/K", "mohr2000"),
  2002: measured(8.314472, "J/mol/K", "mohr2005"),
  2006: measured(8.314472, "J/mol/K", "mohr2008"),
  2010: measured(8.3144621, "J/mol/K", "mohr2012"),
  2014: measured(8.3144598, "J/mol/K", "mohr2016"),
  2018: gasConstant,
  2022: gasConstant,
});

/**
 * Faraday constant by the year of the CODATA adjustment, for reading tables made with it. From 2018 on exact.
 *
 * @see `references.cohen1973` to `references.tiesinga2021`
 * @example
 * faradayConstantByAdjustment[1986].value; // => 96485.309
 */
export const faradayConstantByAdjustment: Readonly<Record<FaradayConstantYear, Constant>> =
  /* @__PURE__ */ Object.freeze({
    1973: measured(96484.56, "C/mol", "cohen1973"),
    1986: measured(96485.309, "C/mol", "cohen1987"),
    1998: measured(96485.3415, "C/mol", "mohr2000"),
    2002: measured(96485.3383, "C/mol", "mohr2005"),
    2006: measured(96485.3399, "C/mol", "mohr2008"),
    2010: measured(96485.3365, "C/mol", "mohr2012"),
    2014: measured(96485.33289, "C/mol", "mohr2016"),
    2018: faradayConstant,
    2022: faradayConstant,
  });

function measured(value: number, unit: string, source: Constant["source"]): Constant {
  return Object.freeze({ value, unit, exact: false, source, origin: "memory" });
}
