export { quantitySchema } from "./quantity/schema.js";
