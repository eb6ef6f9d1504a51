/**
 * Which reading of the dialect this is. Raised whenever the same text would be read differently than before, or
 * something else is kept of it, so that what was kept of an older reading is made again.
 */
export const dialectVersion = 1;
