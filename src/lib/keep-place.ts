/** The state of a navigation that must not move the window: only something on the sheet is marked. */
export const keepPlace = { keepPlace: true } as const;

/** True where a location was come to without moving the window. */
export function keepsPlace(state: unknown): boolean {
  return typeof state === 'object' && state !== null && 'keepPlace' in state;
}
