import type { HazardKind, SignalWord } from './block.ts';

/** A caution in the book's own words, with the signal word that ANSI Z535.6 has for how bad it can be. */
export interface BookCaution {
  readonly signal: SignalWord;
  readonly text: string;
}

const defers = "The maker's manual, local law and licensed practice come before what stands here.";

function warning(text: string): BookCaution {
  return { signal: 'warning', text: `${text} ${defers}` };
}

/**
 * What the book itself says of each hazard: it stands in where a page has no caution of its own, and behind "more" where
 * it has.
 */
export const bookCautions: Readonly<Record<HazardKind, BookCaution>> = {
  battery: warning(
    'A short circuit on a battery welds tools and burns. Take the earthed lead off first and put it on last: the negative, or on a positive-earth bike the positive. Never disconnect battery, main fuse or regulator while the engine runs. Before welding take the battery off and unplug the electronic units. A lithium battery needs a regulator that holds its ceiling and a charger made for it, and is never charged below freezing or after it has gone flat; one that is hot or swollen goes outside, away from people.',
  ),
  starter: warning(
    'The engine can turn and the bike can jump. Put it in neutral and on a stand, with the wheel clear and sleeves away: bridging the start relay turns the engine whatever the switches say. An interlock that is left out breaks bones.',
  ),
  ignition: warning(
    "Ignition gives a shock: thousands of volts at the plug lead and hundreds in the feed of a capacitor igniter, and the engine can fire. A plug that is tested for spark is earthed, and no fuel vapour is near. 12 V on an earthing kill wire is the igniter's end.",
  ),
  charging: warning(
    'An alternator that is unplugged and at speed gives well over 50 V between its phases. Put the meter leads on before the engine starts, and keep hands off while it runs. A regulator gets hot enough to burn skin.',
  ),
  fuel: warning(
    'Fuel vapour burns at the smallest spark. No sparks, no heat and no probe near open fuel; work outside or in moving air.',
  ),
  brakes: warning(
    'A lamp that fails is not seen by whoever rides it. Try both brake switches and every lamp before the road. Lamps, indicators and where they stand are a matter of local law.',
  ),
};

/** What is said where somebody measures. */
export const measuringCaution: BookCaution = warning(
  'Measure resistance only with the battery off. A probe that feeds current never goes into a unit or a sensor. Resting drain is measured with a fused meter, and the engine is never cranked through it.',
);

/** What is said where a loom is laid or something that gets hot is fitted. */
export const routingCaution: BookCaution = warning(
  'Load resistors get hot enough to burn a loom and belong on metal. Move a new loom through full lock and full swing-arm travel, away from the exhaust, before it is tied.',
);
