// `npm run build`: makes what is stale of the client and the server, in `dist/`.
import { buildClient, buildServer } from './lib/build.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { fail } from './lib/say.mjs';

try {
  await ensurePackages();
  await buildServer();
  await buildClient();
} catch (error) {
  fail(error);
}
