export { faultSchema } from "./errors/schema.js";
export { formulaTextSchema, labelTextSchema } from "./formula/schema.js";
export { publishedSeriesSchema, rangePolicySchema } from "./heat-capacity/schema.js";
export { figureSchema, positiveQuantitySchema, quantitySchema } from "./quantity/schema.js";
export {
  labelMapSchema,
  reactionConditionsSchema,
  reactionSchema,
  temperatureSearchSchema,
} from "./reaction/schema.js";
export { originSchema, sourceSchema } from "./references/schema.js";
export {
  collectionSchema,
  phaseSequenceSchema,
  speciesRecordSchema,
  standardConditionsSchema,
  substanceSchema,
  witnessSchema,
} from "./species/schema.js";
