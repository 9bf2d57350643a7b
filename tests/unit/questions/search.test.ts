import { describe, expect, test } from 'vitest';
import { describeBody } from '#server/services/questions/describe-body.ts';
import { plainWords } from '#server/services/questions/plain-words.ts';
import { searchWords } from '#server/services/questions/search-words.ts';

describe('the text that searching reads', () => {
  test.each([
    ['**Bold** and _slanted_ words', 'bold and slanted words'],
    ['CO$_2$ is a gas', 'co2 is a gas _2'],
    ['$\\frac{1}{2}$ of 50\\%', '12 of 50% \\frac{1}{2}'],
    ['# Heading\n\n- one\n- two', 'heading one two'],
    ['| a | b |\n|---|---|\n| 1 | 2 |', 'a b 1 2'],
    ['The author’s “voice”', 'the author\'s "voice"'],
    ['set_a and 15%', 'set_a and 15%'],
    ['It costs \\$5', 'it costs $5'],
  ])('%s', (markdown, words) => {
    expect(plainWords(markdown)).toBe(words);
  });

  test('holds wording, accepted answers, scheme and guidance', () => {
    const { searchText, excerpt, maxMarks } = describeBody({
      stem: '',
      parts: [
        {
          prompt: 'Name the gas.',
          lines: 1,
          answer: { kind: 'text', accept: ['Ammonia', 'NH3'], unlisted: 'wrong' },
          points: [
            { text: 'names ammonia', marks: 1, allow: ['azane'], reject: ['ammonium'] },
            { text: 'spelled right', marks: 2 },
          ],
          modelAnswer: 'ammonia',
        },
      ],
      guidance: 'Smell *with care*.',
    });
    expect(excerpt).toBe('Name the gas.');
    expect(maxMarks).toBe(3);
    for (const word of ['name the gas', 'nh3', 'names ammonia', 'azane', 'ammonium', 'smell with care']) {
      expect(searchText).toContain(word);
    }
  });
});

describe('a typed search', () => {
  test('is taken word by word and literally', () => {
    expect(searchWords('  Rate  of ')).toEqual({ patterns: ['%rate%', '%of%'], number: null });
    expect(searchWords('100%').patterns).toEqual(['%100\\%%']);
    expect(searchWords('a_b\\c').patterns).toEqual(['%a\\_b\\\\c%']);
    expect(searchWords('$x^2$').patterns).toEqual(['%x^2%']);
    expect(searchWords('author’s').patterns).toEqual(["%author's%"]);
  });

  test('may be a number, and may be nothing', () => {
    expect(searchWords('#223')).toEqual({ patterns: ['%#223%'], number: 223 });
    expect(searchWords('223 moles').number).toBeNull();
    expect(searchWords('12345678901').number).toBeNull();
    expect(searchWords(' * ')).toEqual({ patterns: null, number: null });
    expect(searchWords(undefined)).toEqual({ patterns: null, number: null });
  });
});
