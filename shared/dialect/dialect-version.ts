/**
 * Which reading of the dialect this is. Raised whenever the same text would be read differently than before, so that
 * what was kept of an older reading is made again.
 */
export const dialectVersion = 1;
