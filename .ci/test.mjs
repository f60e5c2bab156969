// Runs every check and closes with its time and the tally. Each of types, lint, format and build counts as one check,
// every test as one; a skipped test, a test file that breaks and a run without an answer count as failed.
import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), '..');
const tool = (name) => path.join(root, 'node_modules/.bin', name);
const started = Date.now();
let passed = 0;
let failed = 0;

function run(command, args, { quiet = false } = {}) {
  return new Promise((resolve) => {
    const output = [];
    const child = spawn(command, args, {
      cwd: root,
      env: { ...process.env, MAKEFLAGS: '', NODE_ENV: undefined, FORCE_COLOR: undefined },
      stdio: ['ignore', quiet ? 'pipe' : 'inherit', quiet ? 'pipe' : 'inherit'],
    });
    child.stdout?.on('data', (chunk) => output.push(chunk));
    child.stderr?.on('data', (chunk) => output.push(chunk));
    child.on('error', (error) => resolve({ ok: false, output: String(error) }));
    child.on('close', (code) => resolve({ ok: code === 0, output: Buffer.concat(output).toString() }));
  });
}

async function check(name, command, args) {
  const from = Date.now();
  const { ok, output } = await run(command, args, { quiet: true });
  if (ok) passed += 1;
  else failed += 1;
  if (!ok) process.stdout.write(`${output.trimEnd()}\n`);
  console.log(`${name}: ${ok ? 'passed' : 'FAILED'} (${seconds(from)})`);
}

async function tests() {
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-tally-'));
  const file = path.join(folder, 'jest.json');
  const { ok } = await run(tool('jest'), ['--ci', '--maxWorkers=2', '--json', `--outputFile=${file}`], {
    quiet: false,
  });
  let counted = 0;
  try {
    const tally = JSON.parse(readFileSync(file, 'utf8'));
    counted = tally.numFailedTests + tally.numPendingTests + tally.numTodoTests + tally.numRuntimeErrorTestSuites;
    passed += tally.numPassedTests;
    failed += counted;
    if (tally.numTotalTests === 0) throw new Error('no test ran');
  } catch (error) {
    console.log(`The tests gave no answer: ${error.message}`);
    counted += 1;
    failed += 1;
  }
  if (!ok && counted === 0) failed += 1;
  rmSync(folder, { recursive: true, force: true });
}

function seconds(from) {
  return `${((Date.now() - from) / 1000).toFixed(1)} s`;
}

async function inTurn(...steps) {
  for (const step of steps) await step();
}

await Promise.all([
  inTurn(
    () => check('types', tool('tsc'), ['-b']),
    () => check('lint', tool('eslint'), ['.', '--max-warnings', '0']),
  ),
  inTurn(
    () => check('format', tool('prettier'), ['--check', '--log-level', 'warn', '.']),
    () => check('build', 'make', ['frontend/dist/index.html']),
  ),
]);
await tests();

const total = Math.round((Date.now() - started) / 1000);
console.log(`\nTime: ${Math.floor(total / 60)} min ${total % 60} s`);
console.log(`${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
