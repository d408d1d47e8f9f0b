/**
 * Symbols for the state of aggregation, as the Green Book of IUPAC lists them: gas, liquid, solid, crystalline,
 * amorphous, aqueous solution, vitreous, liquid crystal, solution, adsorbed, monomeric, polymeric, fluid, condensed.
 *
 * @see `references.cohen2007`
 */
export const aggregationStates = [
  "g",
  "l",
  "s",
  "cr",
  "am",
  "aq",
  "vit",
  "lc",
  "sln",
  "ads",
  "mon",
  "pol",
  "fl",
  "cd",
] as const;

/** Symbol for the state of aggregation of a species. */
export type AggregationState = (typeof aggregationStates)[number];

/** Whether a text is one of the symbols for states. */
export function isAggregationState(text: string): text is AggregationState {
  return (aggregationStates as readonly string[]).includes(text);
}

const slips: Readonly<Record<string, AggregationState>> = {
  amorph: "am",
  amorphous: "am",
  aqueous: "aq",
  c: "cr",
  cry: "cr",
  cryst: "cr",
  crystal: "cr",
  crystalline: "cr",
  f: "fl",
  fluid: "fl",
  gas: "g",
  gaseous: "g",
  glass: "vit",
  liq: "l",
  liquid: "l",
  sol: "s",
  solid: "s",
  v: "g",
  vap: "g",
  vapor: "g",
  vapour: "g",
};

/** The state symbol that a word in small letters is likely to mean. */
export function stateMeant(word: string): AggregationState | undefined {
  if (isAggregationState(word)) return word;
  return Object.hasOwn(slips, word) ? slips[word] : undefined;
}
