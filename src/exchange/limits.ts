/** The largest JSON text that is read, in bytes of UTF-8: 64 MiB. */
export const maximumJsonBytes = 67_108_864;

/** How deep arrays and objects may lie within each other; a collection needs some ten levels. */
export const maximumJsonDepth = 100;
