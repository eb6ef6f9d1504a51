import { useEffect, useLayoutEffect, useRef } from 'react';
import { NavigationType, useLocation, useNavigationType, type Location } from 'react-router';
import { keepsPlace } from '../lib/keep-place.ts';

const storageKey = 'earthstrap-places';
type Places = Record<string, number>;

/**
 * Where the window stands after a navigation: where it stood, going back; at what the fragment names; else at the top.
 * The router's own keeper would also jump to a line that was only marked, so this is ours.
 */
export function useScrollKeeper(): void {
  const location = useLocation();
  const type = useNavigationType();
  const places = useRef<Places | null>(null);
  const entry = useRef(entryOf(location));
  const first = useRef(true);

  useEffect(() => {
    places.current ??= readPlaces();
    window.history.scrollRestoration = 'manual';
    function keep(): void {
      if (places.current !== null) places.current[entry.current] = window.scrollY;
    }
    function leave(): void {
      keep();
      window.history.scrollRestoration = 'auto';
      writePlaces(places.current ?? {});
    }
    window.addEventListener('scroll', keep, { passive: true });
    window.addEventListener('pagehide', leave);
    return () => {
      window.removeEventListener('scroll', keep);
      window.removeEventListener('pagehide', leave);
    };
  }, []);

  useLayoutEffect(() => {
    entry.current = entryOf(location);
    if (first.current) {
      // The browser has placed the first sheet itself.
      first.current = false;
      return;
    }
    const place = places.current?.[entryOf(location)];
    if (type === NavigationType.Pop && place !== undefined) window.scrollTo(0, place);
    else if (!keepsPlace(location.state)) scrollTo(location.hash);
  }, [location, type]);
}

/** Names an entry of the history; those that the router did not make itself, as a plain link's, have no key of their own. */
function entryOf({ key, pathname, hash }: Location): string {
  return key === 'default' ? pathname + hash : key;
}

function scrollTo(hash: string): void {
  const target = hash === '' ? null : document.getElementById(decoded(hash.slice(1)));
  if (target === null) window.scrollTo(0, 0);
  else target.scrollIntoView();
}

function decoded(text: string): string {
  try {
    return decodeURIComponent(text);
  } catch {
    return text;
  }
}

function readPlaces(): Places {
  try {
    const kept: unknown = JSON.parse(sessionStorage.getItem(storageKey) ?? '{}');
    if (typeof kept !== 'object' || kept === null) return {};
    return Object.fromEntries(
      Object.entries(kept).filter((pair): pair is [string, number] => typeof pair[1] === 'number'),
    );
  } catch {
    return {};
  }
}

function writePlaces(places: Places): void {
  try {
    sessionStorage.setItem(storageKey, JSON.stringify(places));
  } catch {
    // Storage is full or forbidden: going back after a reload starts at the top.
  }
}
