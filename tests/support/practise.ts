import { randomUUID } from 'node:crypto';
import type TestAgent from 'supertest/lib/agent.js';
import type { HandIn, SetDto, SetItemDto } from '#shared/schemas/practice.ts';

/** An answer to one item as the client would send it: right unless told otherwise. */
export const anAnswer = (item: SetItemDto, values: Partial<HandIn> = {}): HandIn => ({
  id: randomUUID(),
  setItemId: item.id,
  responses: item.question.parts.map((part) => (part.answerKind === 'number' ? '42' : 'A shared pair of electrons.')),
  howSure: 'fairlySure',
  seconds: 40,
  ageMs: 0,
  ...values,
});

/** Opens a set of a kind and gives it back. */
export async function openSet(agent: TestAgent, kind: 'mixed' | 'morning' = 'mixed'): Promise<SetDto> {
  const response = await agent.post('/api/sets').send({ kind });
  if (response.status !== 200) throw new Error(`opening a set answered ${response.status}: ${response.text}`);
  return response.body as SetDto;
}

/** An item that Plait marks by itself, or one that the student marks. */
export function itemOf(set: SetDto, kind: 'shortAnswer' | 'recallCard'): SetItemDto {
  const item = set.items.find((candidate) => candidate.question.kind === kind);
  if (!item) throw new Error(`the set has no ${kind}`);
  return item;
}
