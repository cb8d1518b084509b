// `node scripts/database.mjs [test]`: starts the private cluster (or the tests' throw-away one), prints its address and
// leaves it running; `node scripts/database.mjs [test] stop` stops it. For people at work on the server.
import { Cluster } from './lib/postgres.mjs';
import { fail } from './lib/say.mjs';

try {
  const words = process.argv.slice(2);
  const cluster = await Cluster.open(words.includes('test') ? 'pg-test' : 'pg', {
    throwAway: words.includes('test'),
  });
  if (words.includes('stop')) cluster.stop();
  else console.log(await cluster.start());
} catch (error) {
  fail(error);
}
