import { randomBytes } from 'node:crypto';

/** Makes ids that nobody can guess. Passed to whoever needs one, so that tests count instead. */
export type NewId = () => string;

const alphabet = '0123456789abcdefghjkmnpqrstvwxyz';

/** Sixteen letters and digits that are hard to misread: 80 random bits. */
export const randomId: NewId = () => Array.from(randomBytes(16), (byte) => alphabet[byte % 32]).join('');
