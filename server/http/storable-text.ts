// A null character, or half of a surrogate pair: JSON can write both, no text column can hold either.
const UNSTORABLE = /\0|\p{Surrogate}/u;

/** A reviver for JSON.parse that refuses text no column can hold; the body parser makes a 400 of it. */
export function storableText(_key: string, value: unknown): unknown {
  if (typeof value === 'string' && UNSTORABLE.test(value)) throw new SyntaxError('text that cannot be stored');
  return value;
}
