/** Puts a compressed form beside every text below a folder. */
export function compressFiles(folder: string): void;
