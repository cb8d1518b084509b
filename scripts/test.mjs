// `npm test`: everything that must hold before a change lands, from a fresh clone on.
// `npm test -- lint shared e2e` runs only those stages; `npm test -- shared --match slerp` only matching files.
import { ensurePackages } from './lib/packages.mjs';
import { Tally } from './lib/tally.mjs';
import { fail, say } from './lib/say.mjs';
import { stages, closeStages } from './lib/test-stages.mjs';

const words = process.argv.slice(2);
const matchAt = words.indexOf('--match');
const match = matchAt >= 0 ? words[matchAt + 1] : undefined;
const wanted = words.filter((word, i) => word in stages && (matchAt < 0 || i !== matchAt + 1));

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.on(signal, () => {
    void closeStages().then(() => process.exit(130));
  });
}

const tally = new Tally();
try {
  await ensurePackages();
  for (const name of wanted.length > 0 ? wanted : Object.keys(stages)) {
    const began = performance.now();
    say(`\n── ${name}`);
    await stages[name](tally, { match });
    say(`   ${((performance.now() - began) / 1000).toFixed(0)} s`);
  }
} catch (error) {
  tally.add({ failed: 1 });
  fail(error);
} finally {
  await closeStages();
}
console.log(`\n${tally.passed} passed, ${tally.failed} failed, ${tally.skipped} skipped`);
process.exit(tally.failed > 0 || tally.passed === 0 ? 1 : 0);
