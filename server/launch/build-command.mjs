import { build } from './build.mjs';
import { createLifecycle } from './lifecycle.mjs';
import { explain, Stopped } from './messages.mjs';

// npm run build
const lifecycle = createLifecycle({ exitCode: 130 });
try {
  await build({ lifecycle, inherit: true });
} catch (error) {
  if (!(error instanceof Stopped)) {
    process.stderr.write(`\n${explain(error, 'npm run build')}\n`);
    process.exitCode = 1;
  }
}
