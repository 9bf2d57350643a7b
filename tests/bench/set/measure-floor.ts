import { startChildServer } from './child-server.ts';
import { type LoadFigures, oneByOne, type Sending } from './load.ts';
import { post } from './post.ts';

const REQUESTS = 215;

/** The least a request that writes costs on this machine in this run, one at a time. */
export async function measureFloor(appUrl: string, schoolId: string): Promise<LoadFigures> {
  const server = await startChildServer('./floor-server.ts', { DATABASE_URL: appUrl, BENCH_SCHOOL: schoolId });
  const send: Sending = () => post(server.origin, {});
  try {
    return await oneByOne(Array.from({ length: REQUESTS }, () => send));
  } finally {
    await server.stop();
  }
}
