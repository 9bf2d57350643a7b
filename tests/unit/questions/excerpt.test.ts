import { describe, expect, test } from 'vitest';
import { excerptOf } from '#server/services/questions/excerpt.ts';

const long = (words: number) => Array.from({ length: words }, (_, n) => `word${n}`).join(' ');

describe('an excerpt', () => {
  test('of something short is all of it, on one line', () => {
    expect(excerptOf('Balance:\n\n$\\mathrm{H}_2 + \\mathrm{O}_2$\n')).toBe('Balance: $\\mathrm{H}_2 + \\mathrm{O}_2$');
    expect(excerptOf('')).toBe('');
  });

  test('ends between words', () => {
    const excerpt = excerptOf(long(60));
    expect(excerpt.length).toBeLessThanOrEqual(161);
    expect(long(60).startsWith(`${excerpt.slice(0, -1)} `)).toBe(true);
  });

  test('never ends inside a formula', () => {
    const formula = `$${'x + '.repeat(20)}y$`;
    for (const words of [10, 15, 18, 20, 22]) {
      const excerpt = excerptOf(`${long(words)} ${formula} ${long(30)}`);
      expect(excerpt.split('$').length % 2).toBe(1);
    }
    const whole = `$$${'x + '.repeat(60)}y$$`;
    expect(excerptOf(`${whole} and more`)).toBe(`${whole}…`);
  });

  test('takes an escaped dollar for a dollar', () => {
    const text = `It costs \\$5 and ${long(40)}`;
    expect(excerptOf(text).startsWith('It costs \\$5 and word0')).toBe(true);
  });

  test('leaves tables and listings out where there are words', () => {
    expect(excerptOf('| a | b |\n|---|---|\n| 1 | 2 |\n\nUse the table.')).toBe('Use the table.');
    expect(excerptOf('# The rate\n\nFind it.')).toBe('The rate Find it.');
  });

  test('cuts one endless word', () => {
    expect(excerptOf('a'.repeat(400))).toBe(`${'a'.repeat(160)}…`);
  });
});
