// The app as it is served, in a process that also says how busy it was.
import { answerProbes } from './probe.ts';

answerProbes();
await import('#server/main.ts');
