// @ts-check
import { packageScript, root } from './paths.mjs';
import { run } from './processes.mjs';
import { countStep } from './results.mjs';

const CHECKS = [
  {
    name: 'format (prettier)',
    script: 'prettier/bin/prettier.cjs',
    args: ['--check', '--log-level', 'warn', '.'],
  },
  { name: 'lint (eslint)', script: 'eslint/bin/eslint.js', args: ['--max-warnings', '0', '.'] },
  { name: 'types (tsc)', script: 'typescript/bin/tsc', args: ['--noEmit', '--pretty', '--project', '.'] },
  {
    name: 'imports (dependency-cruiser)',
    script: 'dependency-cruiser/bin/dependency-cruise.mjs',
    args: ['--config', '.dependency-cruiser.cjs', 'src', 'server', 'shared', 'labels', 'tests', 'scripts'],
  },
];

/**
 * Runs every check, also after one has failed; two at a time, the output of each in one piece.
 * @returns {Promise<import('./results.mjs').Result[]>}
 */
export async function runChecks() {
  const waiting = [...CHECKS.entries()];
  /** @type {import('./results.mjs').Result[]} */
  const results = [];
  const work = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) {
      const [index, { name, script, args }] = next;
      const startedAt = Date.now();
      const { code, output } = await run(process.execPath, [packageScript(script), ...args], {
        cwd: root,
        isColoured: true,
      });
      const seconds = ((Date.now() - startedAt) / 1000).toFixed(1);
      console.log(`${code === 0 ? '✓' : '✗'} ${name}, ${seconds} s`);
      if (code !== 0) console.log(output.trimEnd());
      results[index] = countStep(name, code === 0);
    }
  };
  await Promise.all([work(), work()]);
  return results;
}
