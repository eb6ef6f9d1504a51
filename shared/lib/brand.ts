declare const brand: unique symbol;

/** A base type that only its own maker can produce, so that two strings (or numbers) of different meaning never mix. */
export type Brand<Base, Name extends string> = Base & { readonly [brand]: Name };
