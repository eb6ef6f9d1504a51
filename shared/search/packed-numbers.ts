/**
 * Small whole numbers as text, one character a number: what a compressor sees is then one column, not digits and commas.
 * The characters are the printable ones that JSON need not escape.
 */
const alphabet = Array.from({ length: 95 }, (_, index) => String.fromCharCode(32 + index)).filter(
  (character) => character !== '"' && character !== '\\',
);
const base = alphabet.length;
const valueOf = new Uint8Array(128);
alphabet.forEach((character, value) => {
  valueOf[character.charCodeAt(0)] = value;
});

/** A column of whole numbers: one text for each place of its numbers to the base 93, the smallest place first. */
export type PackedNumbers = readonly string[];

/** Packs whole numbers from 0; a column of one repeated number is a single character. */
export function packNumbers(numbers: readonly number[]): PackedNumbers {
  let largest = 0;
  for (const number of numbers) largest = Math.max(largest, number);
  const places: string[] = [];
  for (let divisor = 1; divisor === 1 || divisor <= largest; divisor *= base) {
    const characters = numbers.map((number) => alphabet[Math.floor(number / divisor) % base] ?? '');
    const [first] = characters;
    places.push(characters.every((character) => character === first) ? (first ?? '') : characters.join(''));
  }
  return places;
}

/**
 * Unpacks a column.
 * @param count how many numbers it has, since a repeated number is packed as one
 */
export function unpackNumbers(packed: PackedNumbers, count: number): Uint32Array {
  const numbers = new Uint32Array(count);
  let factor = 1;
  for (const place of packed) {
    const repeated = place.length === 1 ? (valueOf[place.charCodeAt(0)] ?? 0) * factor : null;
    for (let index = 0; index < count; index += 1) {
      numbers[index] = (numbers[index] ?? 0) + (repeated ?? (valueOf[place.charCodeAt(index)] ?? 0) * factor);
    }
    factor *= base;
  }
  return numbers;
}
