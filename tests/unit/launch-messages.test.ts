import { describe, expect, test } from 'vitest';
import {
  DISK_FULL,
  explain,
  explainOutput,
  explainSystemError,
  LaunchError,
  lastLines,
} from '#server/launch/messages.mjs';

const systemError = (code: string, more: object = {}) => Object.assign(new Error(code), { code, ...more });

describe('one sentence for a system error', () => {
  test.each([
    [systemError('EADDRINUSE', { port: 3000 }), 'Port 3000 is taken', 'PORT=3001 npm start'],
    [systemError('EACCES', { port: 80 }), 'may not listen on port 80', 'above 1023'],
    [systemError('ENOSPC'), 'The disk is full', 'free some space'],
    [systemError('EDQUOT'), 'The disk is full', 'free some space'],
    [systemError('EACCES', { path: '.plait' }), 'may not write to .plait', 'chown'],
    [systemError('EPERM', { path: '.plait' }), 'may not write to .plait', 'chown'],
    [systemError('EROFS', { path: '.plait' }), 'read-only', 'copy the project'],
  ])('%s says what is wrong and what to do', (error, problem, cure) => {
    const sentence = explainSystemError(error, 'npm start');
    expect(sentence).toContain(problem);
    expect(sentence).toContain(cure);
    expect(sentence).toMatch(/^[^\n]+\.$/);
  });

  test('an error it does not know has none', () => {
    expect(explainSystemError(systemError('ELOOP'))).toBeUndefined();
    expect(explainSystemError('no error at all')).toBeUndefined();
  });
});

describe("one sentence for a program's output", () => {
  test.each([
    ['FATAL:  could not write to file "pg_wal/x": No space left on device', DISK_FULL],
    ['npm error code ENOSPC', DISK_FULL],
  ])('%s means a full disk', (output, sentence) => {
    expect(explainOutput(output)).toBe(sentence);
  });

  test('names the registry only where npm could not reach it', () => {
    expect(explainOutput('npm error code EAI_AGAIN\nnpm error request to x failed')).toContain('registry');
    expect(explainOutput('connect ETIMEDOUT 10.0.0.1:5432')).toBeUndefined();
  });

  test("does not take PostgreSQL's refusals for those of the file system", () => {
    expect(explainOutput('error: permission denied for table answers')).toBeUndefined();
    expect(explainOutput('mkdir: cannot create directory: Permission denied')).toContain('may not write');
  });
});

describe('what is printed at the end', () => {
  test('our own sentence, with its details below', () => {
    expect(explain(new LaunchError('It is so.'))).toBe('It is so.');
    expect(explain(new LaunchError('It is so.', 'CREATE ROLE x;'))).toBe('It is so.\n\nCREATE ROLE x;');
  });

  test('an unknown error keeps its stack, which is all there is to go by', () => {
    expect(explain(new TypeError('odd'))).toMatch(/odd[\s\S]*launch-messages/);
  });

  test('the last lines that say something', () => {
    expect(lastLines('one\n\ntwo\r\n\nthree\n', 2)).toBe('two\nthree');
  });
});
