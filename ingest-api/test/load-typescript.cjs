/**
 * Lets a worker thread run the TypeScript sources as they are: preloaded with `--require` when tests start a
 * worker. The compiled product needs none of this.
 */
const { readFileSync } = require('node:fs');
const Module = require('node:module');
const { transformSync } = require('@swc/core');

Module._extensions['.ts'] = (module, filename) => {
  const { code } = transformSync(readFileSync(filename, 'utf8'), {
    filename,
    jsc: { target: 'es2022', parser: { syntax: 'typescript', decorators: true } },
    module: { type: 'commonjs' },
  });
  module._compile(code, filename);
};

const resolve = Module._resolveFilename;
Module._resolveFilename = function (request, parent, ...rest) {
  const fromSources = request.startsWith('.') && request.endsWith('.js') && parent?.filename?.endsWith('.ts');
  return resolve.call(this, fromSources ? request.replace(/\.js$/, '.ts') : request, parent, ...rest);
};
