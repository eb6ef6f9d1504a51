import {
  componentKinds,
  hazardKinds,
  type Block,
  type ComponentKind,
  type HazardBlock,
  type HazardKind,
  type Line,
  type SwitchRole,
  type TableBlock,
} from './block.ts';
import { isTableBlock, linesOf } from './lines.ts';

/** The words by which a circuit, a name or a heading touches a hazard; whole words, plural too. */
const hazardWords: Readonly<Record<HazardKind, readonly string[]>> = {
  battery: ['battery', 'main fuse'],
  starter: ['starter', 'start relay', 'start button'],
  ignition: ['ignition coil', 'igniter', 'pick-?up', 'kill switch'],
  charging: ['alternator', 'dynamo', 'regulator'],
  fuel: ['fuel pump', 'fuel tap', 'fuel sender', 'tank'],
  brakes: ['brake lamp', 'brake switch', 'headlamp', 'indicator'],
};

const hazardOfComponent: Readonly<Partial<Record<ComponentKind, HazardKind>>> = {
  battery: 'battery',
  starter: 'starter',
  'ignition-coil': 'ignition',
  igniter: 'ignition',
  alternator: 'charging',
  dynamo: 'charging',
  regulator: 'charging',
};

/** A switch whose role says that it is the one that the words name. */
const hazardOfRole: Readonly<Partial<Record<SwitchRole, HazardKind>>> = {
  start: 'starter',
  kill: 'ignition',
  brake: 'brakes',
  indicators: 'brakes',
};

const patterns: ReadonlyMap<HazardKind, RegExp> = new Map(
  hazardKinds.map((kind) => [
    kind,
    new RegExp(`(?<![\\p{L}\\p{N}])(?:${hazardWords[kind].map(withPlural).join('|')})(?![\\p{L}\\p{N}])`, 'iu'),
  ]),
);

function withPlural(words: string): string {
  const spaced = words.replace(/ /g, '[\\s-]+');
  return spaced.endsWith('y') ? `${spaced.slice(0, -1)}(?:y|ies)` : `${spaced}(?:e?s)?`;
}

/** Any of the words: most circuits have none, and need not be asked six times. */
const anyHazard = new RegExp([...patterns.values()].map(({ source }) => source).join('|'), 'iu');

/** The hazards that a text names. */
export function hazardsNamed(text: string): readonly HazardKind[] {
  if (!anyHazard.test(text)) return [];
  return hazardKinds.filter((kind) => patterns.get(kind)?.test(text));
}

/** The hazards that a block touches: by its components, its names and its circuits. A caution and a sum touch none. */
export function hazardsTouched(block: Block): readonly HazardKind[] {
  if (!isTableBlock(block)) return [];
  const touched = new Set(hazardsOfBlock(block));
  for (const line of linesOf(block)) for (const kind of hazardsOfRow(line)) touched.add(kind);
  return hazardKinds.filter((kind) => touched.has(kind));
}

/** The hazards that one line touches: what its block's name says, and its own component, name and circuit. */
export function hazardsTouchedByLine(block: TableBlock, line: Line): readonly HazardKind[] {
  const touched = new Set(hazardsOfBlock(block));
  for (const kind of hazardsOfRow(line)) touched.add(kind);
  return hazardKinds.filter((kind) => touched.has(kind));
}

function hazardsOfBlock(block: TableBlock): readonly HazardKind[] {
  const named = hazardsNamed(nameOrId(block.name, block.id));
  const byRole = block.kind === 'switch' ? hazardOfRole[block.role] : undefined;
  return byRole === undefined ? named : [...named, byRole];
}

/** What a row says by the properties that it has: only components have a kind, only checks are named `check`. */
function hazardsOfRow(line: Line): readonly HazardKind[] {
  if ('circuit' in line) return hazardsNamed(textOf(line.circuit));
  if ('check' in line) return hazardsNamed(textOf(line.check));
  if (!('componentKind' in line) || !('name' in line) || !('id' in line)) return [];
  const named = hazardsNamed(nameOrId(line.name === null ? null : textOf(line.name), textOf(line.id)));
  const componentKind = componentKinds.find((kind) => kind === line.componentKind);
  const byKind = componentKind === undefined ? undefined : hazardOfComponent[componentKind];
  return byKind === undefined ? named : [...named, byKind];
}

function textOf(value: unknown): string {
  return typeof value === 'string' ? value : '';
}

/** Where something has no name its id is what readers see, so its words count. */
function nameOrId(name: string | null, id: string | null): string {
  return name ?? (id ?? '').replace(/-/g, ' ');
}

/** What a caution is of: what it says itself, else what its words name. */
export function hazardsOf({ of, text }: HazardBlock): readonly HazardKind[] {
  return of.length > 0 ? of : hazardsNamed(text);
}
