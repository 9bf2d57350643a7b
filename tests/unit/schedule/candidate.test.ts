import { expect, test } from 'vitest';
import { secondsOf } from '#shared/domain/schedule/candidate.ts';

// Scheduling specification, section 1: c is held within 20 to max(120, 75 × marks) seconds.
test.each([
  [{ expectedSeconds: 1, marks: 1 }, 20],
  [{ expectedSeconds: 45, marks: 1 }, 45],
  [{ expectedSeconds: 1000, marks: 1 }, 120],
  [{ expectedSeconds: 1000, marks: 4 }, 300],
])('expected seconds are held within their bounds: %j', (given, seconds) => {
  expect(secondsOf(given)).toBe(seconds);
});
