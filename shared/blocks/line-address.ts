import { compareCodePoints } from '../lib/code-point-order.ts';
import { slugOf } from '../lib/slug.ts';
import type { Applicability } from '../pages/applicability.ts';
import { addressSuffix } from '../pages/applicability-words.ts';
import type { TerminalName } from './block.ts';
import { formatTerminalName } from './terminal-name.ts';

/*
 * Addresses of lines, made of what a row says and never of its number. They are the fragment of the page's URL and the
 * id of the row's element, so they hold no white space.
 */

function address(name: string, applies: Applicability): string {
  return name.replace(/\s+/g, '-') + addressSuffix(applies);
}

/** `headlight.3`, and `headlight.2+` for a further wire in a cavity. */
export function cavityAddress(connector: string, cavity: string, further: number, applies: Applicability): string {
  return address(`${connector}.${cavity}${'+'.repeat(further)}`, applies);
}

/** `main-fuse`. */
export function componentAddress(component: string, applies: Applicability): string {
  return address(component, applies);
}

/** `ignition@on`: the position as a slug, or as it is written where no letter or figure of it can stand in one. */
export function positionAddress(switchId: string, position: string, applies: Applicability): string {
  return address(`${switchId}@${slugOrText(position)}`, applies);
}

/** `ignition.R--main-fuse.out`: both ends in the order of their code points. */
export function wireAddress(from: TerminalName, to: TerminalName, applies: Applicability): string {
  const ends = [formatTerminalName(from), formatTerminalName(to)].toSorted(compareCodePoints);
  return address(ends.join('--'), applies);
}

/** `flash-unit@49--49a`, in the order of the row; `flash-unit@49` where `To` is empty. */
export function insideAddress(unit: string, from: string, to: string | null, applies: Applicability): string {
  return address(`${unit}@${to === null ? from : `${from}--${to}`}`, applies);
}

/** `check@pickup-coil`. */
export function checkAddress(check: string, applies: Applicability): string {
  return address(`check@${slugOrText(check)}`, applies);
}

/**
 * The two ends in a wire's address, split at the last `--`, since a terminal may be called `-`: `battery.---frame` are
 * `battery.-` and `frame`. Null for the address of another line. What the row holds for is left out.
 */
export function wireEnds(wire: string): readonly [string, string] | null {
  const ends = wire.split('~')[0] ?? '';
  const at = ends.lastIndexOf('--');
  if (at < 1 || ends.includes('@')) return null;
  return [ends.slice(0, at), ends.slice(at + 2)];
}

function slugOrText(text: string): string {
  const slug = slugOf(text);
  return slug === '' ? text : slug;
}
