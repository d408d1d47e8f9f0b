import fc from "fast-check";
import { expect, test } from "vitest";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import { randomSeries, temperaturesK } from "./random-series.js";
import { cancelled, worstShare } from "./worst-share.js";

test.each(heatCapacityForms)("random fits of the form %s stay within 4 eps of their absolute terms", (form) => {
  fc.assert(
    fc.property(randomSeries[form], temperaturesK, fc.boolean(), (series, temperatureK, cancels) => {
      const fit = cancels ? cancelled(series, temperatureK) : series;
      expect(worstShare(fit, temperatureK)).toBeLessThanOrEqual(1);
    }),
    // Four functions each: 1e5 evaluations and more over the forms.
    { seed: 20270101, numRuns: 10_000 },
  );
});
