// A thread of Node 20 reads no TypeScript, not even under tsx: the loader has to be registered inside it first.
import { register } from 'tsx/esm/api';

register();
await import('./worker.ts');
