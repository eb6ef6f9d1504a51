/** Numbers from 0 to 1 that are the same on every machine for the same seed (mulberry32, public domain). */
export type Dice = () => number;

/** Makes dice of a seed. */
export function createDice(seed: number): Dice {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

/** One of a list. */
export function pick<Value>(dice: Dice, list: readonly Value[]): Value {
  const value = list[Math.floor(dice() * list.length)];
  if (value === undefined) throw new Error('nothing to pick from');
  return value;
}

const common =
  `the a of and to in is it that on with for as at by from or not be this are but have an which you when if one there will
  out up then off only before after where under behind between through over until each both two three first last same
  other more less old new good bad long short clean dry wet hot cold loose tight left right front rear top bottom inside`.split(
    /\s+/,
  );
const trade =
  `connector cavity terminal wire loom tracer earth frame engine battery fuse relay switch lamp bulb headlamp indicator
  horn starter solenoid igniter coil pickup alternator regulator rectifier charging ignition kill clutch neutral stand
  brake tail pilot beam dip main crimp bullet spade solder sleeve tape heat shrink corrosion green crust verdigris
  resistance volts ohms amps meter probe continuity open short reading measure check unplug push pull latch tang seal
  grommet clip bracket bolt seat tank cover bars bucket yoke swing arm exhaust lock travel chafe rub break strand copper
  gauge diagram manual page figure year model market owner previous repair bodge splice tap lead charge drain load
  current voltage drop feed return switched live permanent position rest momentary thermal flasher module unit diode
  resistor condenser points advance timing spark plug cap winding stator rotor brush slip ring dynamo field sender
  oil pressure temperature fuel pump gauge clock tell-tale dial bench spanner screwdriver photograph label bag tag`.split(
    /\s+/,
  );
const syllables =
  `ba be bi bo bra bre da de di dor du fa fel fi for ga gel gi gor ha hel hi hor ka kel ki kor la len li lor ma mel
  mi mor na nel ni nor pa pel pi por ra rel ri ror sa sel si sor ta tel ti tor va vel vi vor wa wel wi wor`.split(
    /\s+/,
  );

/** A word that no language has. */
export function madeWord(dice: Dice, least: number, most: number): string {
  const count = least + Math.floor(dice() * (most - least + 1));
  return Array.from({ length: count }, () => pick(dice, syllables)).join('');
}

/** A writer of prose whose words are as unevenly frequent as those of a language (Zipf's law, exponent 1). */
export function createWriter(dice: Dice, vocabulary: number): (words: number) => string {
  const words = [...new Set([...common, ...trade])];
  const known = new Set(words);
  while (words.length < vocabulary) {
    const word = madeWord(dice, 2, 4);
    if (!known.has(word)) words.push(word);
    known.add(word);
  }
  const scale = Math.log(words.length + 1);
  return (count) => {
    const sentences: string[] = [];
    for (let left = count; left > 0;) {
      const length = Math.min(left, 6 + Math.floor(dice() * 12));
      const sentence = Array.from({ length }, () => words[Math.floor(Math.exp(dice() * scale)) - 1] ?? 'the').join(' ');
      sentences.push(`${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`);
      left -= length;
    }
    return sentences.join(' ');
  };
}
