import type { Drawer } from './kept-texts.ts';

/** Keeps nothing: on the server, and where a browser forbids its storage. */
const noDrawer: Drawer = {
  getItem: () => null,
  setItem() {
    throw new Error('Nothing can be kept here');
  },
  removeItem: () => undefined,
};

/** Where this browser keeps texts. */
export function browserDrawer(): Drawer {
  try {
    return typeof window === 'undefined' ? noDrawer : window.localStorage;
  } catch {
    return noDrawer;
  }
}
