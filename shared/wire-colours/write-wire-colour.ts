import { codesOf, colourCodes } from './colour-codes.ts';
import type { ColourName, ColourSystem, ColourSystemName, WireColour } from './colour-system.ts';

/**
 * Writes a wire's colour as a system's diagrams do: `Y/R`, in DIN joined (`YERD`). A page's own key is used where the
 * system itself is given. Where the system has no code for one of the colours, words stand instead: `turquoise/red`.
 */
export function wireColourCode(colour: WireColour, system: ColourSystemName | ColourSystem): string {
  const name = typeof system === 'string' ? system : system.name;
  const table = typeof system === 'string' ? colourCodes(system) : codesOf(system);
  const codeOf = (wanted: ColourName): string | undefined => table.find((row) => row.colour === wanted)?.code;
  const { base, tracer } = colour;
  const baseCode = codeOf(base);
  if (tracer === null) return baseCode ?? base;
  const tracerCode = codeOf(tracer);
  if (baseCode === undefined || tracerCode === undefined) return `${base}/${tracer}`;
  return name === 'din' ? `${baseCode}${tracerCode}` : `${baseCode}/${tracerCode}`;
}
