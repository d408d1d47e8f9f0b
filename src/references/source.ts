import type { Citation } from "./bibliography.js";

/** Where a figure comes from: an entry of the bibliography, or a user's own words. */
export type Source = Citation | { readonly text: string };

/** Whether a figure was read from the page of its source or recalled from memory. */
export type Origin = "page" | "memory";
