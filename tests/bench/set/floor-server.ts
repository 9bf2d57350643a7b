// The least that a request which writes can cost here: bare Express, the school's transaction, one INSERT.
import { randomUUID } from 'node:crypto';
import express from 'express';
import { execute, withSchool } from '#server/db/scope.ts';
import { answerProbes } from './probe.ts';

const schoolId = process.env.BENCH_SCHOOL ?? '';
const INSERT = `
  INSERT INTO audit (school_id, id, at, action, object_type, outcome) VALUES ($1, $2, $3, 'bench', 'floor', 'done')`;

answerProbes();
const app = express();
app.get('/ready', (_request, response) => void response.json({ status: 'ready' }));
app.post('/', async (_request, response) => {
  await withSchool(schoolId, ({ now }) => execute(INSERT, [schoolId, randomUUID(), now]));
  response.json({ status: 'written' });
});
app.listen(Number(process.env.PORT), '127.0.0.1');
