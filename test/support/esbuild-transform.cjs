/** Jest transform for ES-module packages: esbuild turns them into CommonJS, far faster than TypeScript would. */
const { transformSync } = require('esbuild');

module.exports = {
  process(source, filename) {
    const { code, map } = transformSync(source, {
      format: 'cjs',
      target: 'node20',
      sourcemap: true,
      sourcefile: filename,
      loader: 'js',
    });
    return { code, map };
  },
};
