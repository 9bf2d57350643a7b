import type { AnswerForm, PartForm, PointForm, QuestionForm } from './question-shape.ts';

export const emptyPoint = (): PointForm => ({ code: '', text: '', marks: 1, notes: [] });

export const emptyAnswer = (kind: AnswerForm['kind']): AnswerForm => ({
  kind,
  value: '',
  accuracy: 'tolerance',
  tolerance: '',
  min: '',
  max: '',
  unit: '',
  isUnitRequired: false,
  accept: '',
  reject: '',
  unlisted: 'selfMark',
});

export const emptyPart = (): PartForm => ({
  prompt: '',
  lines: 2,
  answerLabel: '',
  answer: emptyAnswer('text'),
  points: [emptyPoint()],
  modelAnswer: '',
});

export const emptyQuestion = (topicIds: string[] = []): QuestionForm => ({
  kind: 'shortAnswer',
  tier: '',
  option: '',
  expectedSeconds: 90,
  topicIds,
  stem: '',
  guidance: '',
  parts: [emptyPart()],
});
