// Runs the benchmark from its sources: TypeScript through swc, the project's packages by alias.
const { readFileSync, existsSync } = require('node:fs');
const { join } = require('node:path');
const Module = require('node:module');
const swc = require('@swc/core');

const root = join(__dirname, '..', '..');

Module._extensions['.ts'] = (module, file) => {
  const { code } = swc.transformSync(readFileSync(file, 'utf8'), {
    filename: file,
    swcrc: false,
    sourceMaps: 'inline',
    module: { type: 'commonjs' },
    jsc: {
      target: 'es2022',
      keepClassNames: true,
      parser: { syntax: 'typescript', decorators: true },
      transform: { legacyDecorator: true, decoratorMetadata: true },
    },
  });
  module._compile(code, file);
};

const resolve = Module._resolveFilename;
Module._resolveFilename = function (request, ...rest) {
  const common = /^@bellgap\/common\/(\w+)$/.exec(request);
  if (common) return resolve.call(this, join(root, 'common', 'src', common[1], 'index.ts'), ...rest);
  if (request === '@bellgap/database') return resolve.call(this, join(root, 'database', 'src', 'index.ts'), ...rest);
  if (/^\.{1,2}\//.test(request)) {
    const parent = rest[0];
    const base = parent && parent.filename ? join(parent.filename, '..', request) : request;
    for (const candidate of [`${base}.ts`, join(base, 'index.ts')]) {
      if (existsSync(candidate)) return candidate;
    }
  }
  return resolve.call(this, request, ...rest);
};

require('./main.ts');
