import { randomUUID } from 'node:crypto';

let counter = 0;

/** A number no other factory row of this process has. */
export const unique = (): number => {
  counter += 1;
  return counter;
};

/** A short code no other school has, in this process or another. */
export const uniqueCode = (prefix: string): string => `${prefix}-${randomUUID().slice(0, 8)}`;
