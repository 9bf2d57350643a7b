import { checkNode } from './node-version.mjs';

// The rest is loaded after the check only: an old Node could not even read it.
checkNode();
void import('./start-dev.mjs').then(({ startDev }) => startDev());
