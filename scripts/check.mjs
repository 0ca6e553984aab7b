// @ts-check
// npm run check: format, lint, types and import rules.
import { runChecks } from './lib/checks.mjs';
import { runCommand } from './lib/lifetime.mjs';
import { ensureNodeModules } from './lib/nodeModules.mjs';
import { checkNodeVersion } from './lib/nodeVersion.mjs';
import { exitCodeOf, summarise } from './lib/results.mjs';

await runCommand(
  async () => {
    checkNodeVersion();
    await ensureNodeModules({ needsDev: true });
    const sum = summarise(await runChecks());
    console.log(`\n${sum.lines.join('\n')}`);
    return exitCodeOf(sum);
  },
  { interruptedCode: 130 },
);
