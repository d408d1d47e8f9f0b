/** The caution that every report carries. */
export const caution: string =
  "Calculated values depend on the data and model chosen. They are no substitute for measured data, relief and hazard " +
  "studies, local codes or the judgement of a licensed or qualified engineer. An equilibrium result says nothing about " +
  "how fast.";
