/** Finds uses of functions that may differ between engines. */
export function findEngineFunctions(paths: string[]): { file: string; line: number; message: string }[];
