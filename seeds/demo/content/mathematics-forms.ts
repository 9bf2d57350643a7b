import type { AnswerSpec } from '#shared/schemas/question-body.ts';
import { wording } from './build.ts';

/** The ways of typing one expression: spaced or not, × as a letter or a star, a raised or a caret index, either minus. */
function typings(form: string): string[] {
  const raised: Record<string, string> = { '²': '^2', '⁵': '^5' };
  const caret = form.replace(/[²⁵]/g, (sign) => raised[sign] ?? sign);
  const times = [form, caret].flatMap((text) => [text, text.replaceAll('×', 'x'), text.replaceAll('×', '*')]);
  const minus = times.flatMap((text) => [text, text.replaceAll('−', '-')]);
  return minus.flatMap((text) => [text, text.replaceAll(' ', '')]);
}

/** An algebraic answer, in every listed order of terms; one that is not listed is marked by the student. */
export const algebra = (...forms: string[]): AnswerSpec => wording(...new Set(forms.flatMap(typings)));
