import type { ColourSystem, WireColour } from './colour-system.ts';
import { readWireColour } from './read-wire-colour.ts';

const systems: readonly ColourSystem[] = [{ name: 'jis' }, { name: 'bs-au7' }, { name: 'din' }, { name: 'iec' }];

/**
 * Every wire that a text may mean in any of the published systems, or in words, without repetitions: for a search, whose
 * asker has not said which system. Empty where it is no colour in any of them.
 */
export function coloursInAnySystem(text: string): readonly WireColour[] {
  const found = new Map<string, WireColour>();
  for (const system of systems) {
    const reading = readWireColour(text, system);
    if (reading.kind === 'unknown') continue;
    const colours = reading.kind === 'ambiguous' ? [reading.colour, ...reading.others] : [reading.colour];
    for (const colour of colours) found.set(`${colour.base}/${colour.tracer ?? ''}`, colour);
  }
  return [...found.values()];
}
