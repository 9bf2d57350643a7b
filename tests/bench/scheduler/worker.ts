import { parentPort } from 'node:worker_threads';
import { type Job, runJob } from './job.ts';

parentPort?.on('message', (job: Job) => parentPort?.postMessage(runJob(job)));
