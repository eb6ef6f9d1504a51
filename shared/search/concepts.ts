/**
 * What the trade calls by several names. Each row is one thing; every name finds the others. Names are plain words in
 * the singular. Both sides of a search are read with this table, so a longer name always wins over a shorter one
 * inside it: `dip switch` is not `dip`.
 */
const synonyms: readonly (readonly string[])[] = [
  [
    'indicator',
    'turn signal',
    'direction indicator',
    'turn indicator',
    'blinker',
    'winker',
    'trafficator',
    'turn lamp',
    'turn light',
    'flashing indicator',
  ],
  ['indicator switch', 'turn signal switch', 'blinker switch', 'winker switch'],
  [
    'flasher',
    'flasher unit',
    'flasher relay',
    'flasher can',
    'flash unit',
    'turn signal relay',
    'indicator relay',
    'blinker relay',
  ],
  ['earth', 'ground', 'gnd', 'earthed', 'grounded', 'earthing', 'grounding'],
  ['earth strap', 'ground strap', 'earth lead', 'ground cable', 'earth cable', 'ground lead', 'engine strap'],
  ['dip', 'dipped', 'dip beam', 'dipped beam', 'low beam', 'lo beam'],
  [
    'dip switch',
    'dipper switch',
    'dimmer switch',
    'dimmer',
    'dipper',
    'beam switch',
    'high low switch',
    'hi lo switch',
  ],
  ['main beam', 'high beam', 'full beam', 'hi beam', 'driving beam'],
  [
    'main beam tell tale',
    'high beam indicator',
    'high beam tell tale',
    'main beam warning light',
    'high beam lamp',
    'high beam warning light',
    'main beam indicator',
  ],
  ['loom', 'harness', 'wiring harness', 'wiring loom', 'wire harness', 'cable loom', 'cable harness'],
  ['headlamp', 'headlight', 'head lamp', 'head light'],
  ['tail lamp', 'tail light', 'rear lamp', 'rear light', 'taillight', 'taillamp'],
  ['brake lamp', 'brake light', 'stop lamp', 'stop light', 'brakelight', 'stoplight'],
  ['brake switch', 'brake light switch', 'brake lamp switch', 'stop switch', 'stop light switch', 'stop lamp switch'],
  [
    'pilot lamp',
    'pilot light',
    'parking lamp',
    'parking light',
    'side lamp',
    'side light',
    'sidelight',
    'position lamp',
    'position light',
    'running light',
  ],
  ['tell tale', 'telltale', 'warning light', 'warning lamp', 'idiot light', 'indicator lamp', 'indicator light'],
  [
    'number plate lamp',
    'number plate light',
    'licence plate light',
    'license plate light',
    'licence light',
    'license light',
    'plate lamp',
    'plate light',
  ],
  ['dial lamp', 'dial light', 'instrument light', 'instrument lamp', 'gauge light', 'meter light', 'clock light'],
  ['instrument', 'gauge', 'clock', 'dash', 'dashboard', 'dial'],
  [
    'kill switch',
    'engine stop switch',
    'stop button',
    'kill button',
    'engine kill switch',
    'cut out switch',
    'cutout switch',
    'engine cut off',
    'run stop switch',
    'killswitch',
  ],
  ['ignition switch', 'key switch', 'ignition key', 'main switch'],
  ['ignition coil', 'spark coil', 'ht coil', 'ignition ht coil'],
  [
    'pickup',
    'pick up',
    'pulser',
    'pulser coil',
    'pulse coil',
    'pickup coil',
    'pick up coil',
    'trigger coil',
    'pulse generator',
    'pulsar coil',
  ],
  ['igniter', 'ignitor', 'cdi', 'cdi unit', 'ignition unit', 'ignition module', 'ignition box', 'spark unit'],
  ['point', 'contact breaker', 'breaker point'],
  ['condenser', 'capacitor'],
  ['alternator', 'generator', 'magneto generator'],
  ['regulator', 'rectifier', 'reg rec', 'reg rect', 'regulator rectifier', 'rec reg', 'voltage regulator', 'reg'],
  ['starter', 'starter motor', 'start motor', 'electric starter'],
  ['starter relay', 'start relay', 'starter solenoid', 'start solenoid', 'solenoid'],
  ['start button', 'starter button', 'start switch', 'starter switch'],
  ['side stand', 'sidestand', 'prop stand', 'propstand', 'kick stand', 'kickstand', 'jiffy stand'],
  ['fuse box', 'fusebox', 'fuse holder', 'fuseholder', 'fuse block'],
  ['main fuse', 'main link', 'fusible link', 'battery fuse'],
  ['horn', 'hooter', 'klaxon'],
  ['battery', 'accumulator', 'batt'],
  ['fuel', 'petrol', 'gasoline'],
  ['fuel tap', 'petcock', 'petrol tap', 'fuel cock'],
  ['oil pressure', 'oil warning'],
  ['contactless ignition', 'electronic ignition', 'transistor ignition'],
  ['switchgear', 'bar cluster', 'handlebar switch', 'bar switch', 'handlebar control', 'switch cluster', 'switch pod'],
  ['colour', 'color'],
  ['grey', 'gray'],
  ['diagram', 'schematic'],
  ['left', 'lh', 'lhs', 'l h', 'nearside'],
  ['right', 'rh', 'rhs', 'r h', 'offside'],
  ['rear', 'back', 'rr'],
  ['front', 'fr'],
  ['switch', 'sw'],
  ['temperature', 'temp'],
  ['volt', 'voltage'],
  ['light', 'lamp', 'bulb'],
  ['feed', 'supply'],
  ['live', 'hot', 'positive'],
  ['handlebar', 'bar'],
  ['safe modification', 'safe mod', 'modification', 'mod'],
];

const marker = '~';

interface ConceptName {
  readonly words: readonly string[];
  readonly concept: string;
}

/** Every name by its first word, longer ones first: most words begin none, and are passed over by one look-up. */
const namesBeginning = new Map<string, ConceptName[]>();
for (const names of synonyms) {
  const concept = marker + (names[0] ?? '').replace(/ /g, '');
  for (const name of names) {
    const words = name.split(' ');
    const first = words[0] ?? '';
    namesBeginning.set(first, [...(namesBeginning.get(first) ?? []), { words, concept }]);
  }
}
for (const names of namesBeginning.values()) names.sort((a, b) => b.words.length - a.words.length);

function standsAt(words: readonly string[], start: number, name: ConceptName): boolean {
  return name.words.every((word, at) => words[start + at] === word);
}

/** A stretch of words that names a concept: where it stands, how many words it takes, and the concept. */
export interface ConceptFound {
  readonly start: number;
  readonly length: number;
  /** Begins with `~`, so that it is never mistaken for a word. */
  readonly concept: string;
}

/** Finds the concepts in plain words, left to right, the longest name first, none overlapping another. */
export function findConcepts(words: readonly string[]): ConceptFound[] {
  const found: ConceptFound[] = [];
  for (let start = 0; start < words.length;) {
    const name = namesBeginning.get(words[start] ?? '')?.find((candidate) => standsAt(words, start, candidate));
    if (name !== undefined) found.push({ start, length: name.words.length, concept: name.concept });
    start += name?.words.length ?? 1;
  }
  return found;
}

/** Every concept that plain words name, also those inside another's name: `dip switch` is also `dip` and `switch`. */
export function conceptsWithin(words: readonly string[]): string[] {
  const found: string[] = [];
  words.forEach((word, start) => {
    for (const name of namesBeginning.get(word) ?? []) if (standsAt(words, start, name)) found.push(name.concept);
  });
  return found;
}
