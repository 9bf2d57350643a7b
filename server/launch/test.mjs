import { checkNode } from './node-version.mjs';

// The rest is loaded after the check only: an old Node could not even read it.
checkNode();
void import('./run-tests.mjs').then(({ runTests }) => runTests(process.argv.slice(2)));
