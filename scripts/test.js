import { spawn } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { ensureHostPackages } from './hostPackages.js'
import { ensureNpmPackages } from './npmPackages.js'
import { SetUpError } from './progress.js'

const root = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '')
const reports = mkdtempSync(join(tmpdir(), 'bothways-test-'))
const bin = (name) => join(root, 'node_modules', '.bin', name)

/** Each step counts as one test, a Vitest suite as the tests it ran. Those of one group run side by side. */
const checks = [
  [
    ['format', bin('prettier'), ['--check', '--log-level', 'warn', '.']],
    ['lint', bin('eslint'), ['--config', 'scripts/eslint.config.js', '.']],
  ],
  [
    ['types of shared', bin('tsc'), ['-p', 'shared']],
    ['types of server and scripts', bin('tsc'), ['-p', '.']],
  ],
  [
    ['types of src', bin('vue-tsc'), ['-p', 'src']],
    ['types of tests', bin('vue-tsc'), ['-p', 'tests']],
  ],
]
const suites = ['shared', 'server', 'client']

function run(name, command, commandArguments) {
  process.stdout.write(`\n── ${name}\n`)
  const begun = Date.now()
  return new Promise((resolve) => {
    const child = spawn('setpriv', ['--pdeathsig', 'TERM', '--', command, ...commandArguments], {
      cwd: root,
      stdio: ['ignore', 'inherit', 'inherit'],
    })
    child.once('error', () => resolve(false))
    child.once('exit', (status) => {
      process.stdout.write(`── ${name}: ${status === 0 ? 'passed' : 'FAILED'}, ${((Date.now() - begun) / 1000).toFixed(1)} s\n`)
      resolve(status === 0)
    })
  })
}

/** @returns {Promise<{ passed: number, failed: number }>} a suite that ran no test, or ended badly without a failed test, has failed */
async function runSuite(name) {
  const report = join(reports, `${name}.json`)
  const words = [
    'run',
    '--config',
    'tests/vitest.config.ts',
    '--project',
    name,
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ]
  const isGood = await run(`${name} tests`, bin('vitest'), words)
  let passed = 0
  let failed = 0
  try {
    const result = JSON.parse(readFileSync(report, 'utf8'))
    passed = result.numPassedTests
    failed = result.numFailedTests
  } catch (cause) {
    process.stdout.write(`no report of the ${name} tests: ${cause.message}\n`)
  }
  if (failed === 0 && (!isGood || passed === 0)) failed = 1
  return { passed, failed }
}

async function main() {
  await ensureHostPackages(['mariadb', 'chromium', 'poppler'])
  await ensureNpmPackages(root)
  const total = { passed: 0, failed: 0 }
  const count = ({ passed, failed }) => {
    total.passed += passed
    total.failed += failed
  }
  for (const group of checks) {
    for (const isGood of await Promise.all(group.map((check) => run(...check))))
      count(isGood ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 })
  }
  for (const suite of suites) count(await runSuite(suite))
  const isBuilt = await run('build of the client', bin('vite'), ['build', '--logLevel', 'warn'])
  count(isBuilt ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 })
  count(await runSuite('e2e'))
  process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`)
  return total.failed === 0 ? 0 : 1
}

main()
  .catch((cause) => {
    process.stderr.write(`${cause instanceof SetUpError ? cause.message : cause.stack}\n`)
    process.stdout.write('\n0 passed, 1 failed\n')
    return 1
  })
  .then((status) => {
    rmSync(reports, { recursive: true, force: true })
    process.exit(status)
  })
