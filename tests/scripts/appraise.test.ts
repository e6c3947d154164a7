import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'
import { apiError } from '#shared/contracts/apiError'
import { appraisal } from '#shared/contracts/appraisalResult'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))
const ONE_PANEL = readFileSync(join(ROOT, 'shared/examples/one-panel.json'), 'utf8')

const folder = mkdtempSync(join(tmpdir(), 'appraise-'))
afterAll(() => rmSync(folder, { recursive: true }))

/** Runs the command as npm does: in the project's folder, the caller's folder in INIT_CWD. */
function appraise(...args: string[]) {
  const { status, stdout, stderr } = spawnSync(process.execPath, ['--import', 'tsx', 'scripts/appraise.ts', ...args], {
    cwd: ROOT,
    env: { ...process.env, INIT_CWD: folder },
    encoding: 'utf8',
  })
  return { status, stdout, stderr }
}

function write(name: string, text: string): string {
  writeFileSync(join(folder, name), text)
  return name
}

describe('the command', () => {
  it('prints the appraisal of a file in the caller’s folder', () => {
    const { status, stdout, stderr } = appraise(write('one-panel.json', ONE_PANEL))
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' })
    expect(appraisal.parse(JSON.parse(stdout)).schemes.map(({ mark }) => mark)).toEqual(['R1', 'S1'])
  })

  it('ends with 0 where checks fail: that is a result', () => {
    const tooThin = ONE_PANEL.replace(/"thickness": "least"/, '"thickness": 50')
    const { status, stdout } = appraise(write('thin.json', tooThin))
    expect(status).toBe(0)
    expect(appraisal.parse(JSON.parse(stdout)).schemes.at(-1)!.passes).toBe(false)
  })

  it.each([
    ['no file named', [], 'invalid_request', []],
    ['two files named', ['a.json', 'b.json'], 'invalid_request', []],
    ['a file that is not there', ['nowhere.json'], 'not_found', []],
    ['a folder', ['.'], 'invalid_request', []],
    ['text that is not JSON', [write('text.json', 'span: 6.0')], 'invalid_request', []],
    ['an empty file', [write('empty.json', '')], 'invalid_request', []],
    ['another format', [write('format.json', ONE_PANEL.replace('appraisal/1', 'appraisal/9'))], 'invalid_request', ['format']],
    [
      'text in a number',
      [write('cover.json', ONE_PANEL.replace('"cover": 25', '"cover": "25"'))],
      'invalid_request',
      ['brief.cover'],
    ],
    [
      'a billion repeats',
      [write('repeat.json', ONE_PANEL.replace('"mark": "L1"', '"mark": "L1", "repeat": 1e9'))],
      'invalid_request',
      ['levels.0.repeat'],
    ],
    [
      'a panel that nothing bears',
      [write('free.json', ONE_PANEL.replace('"supportWidth": 250', '"supportWidth": 0').replace('"discontinuous"', '"free"'))],
      'out_of_scope',
      ['levels.0.panels.0.edges'],
    ],
  ])('refuses %s with status 2, the error on stderr and nothing on stdout', (_what, args, code, paths) => {
    const { status, stdout, stderr } = appraise(...args)
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' })
    const body = apiError.parse(JSON.parse(stderr))
    expect(body).toMatchObject({ code, requestId: 'command' })
    expect((body.issues ?? []).map(({ path }) => path)).toEqual(paths)
  })

  it('refuses a floor that cannot be, naming the outline', () => {
    const file = JSON.parse(ONE_PANEL) as { levels: { panels: { outline: number[][] }[] }[] }
    file.levels[0]!.panels[0]!.outline.reverse()
    const { status, stdout, stderr } = appraise(write('clockwise.json', JSON.stringify(file)))
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' })
    expect(apiError.parse(JSON.parse(stderr)).issues![0]!.path).toMatch(/^levels\.0\.panels\.0\.outline/)
  })

  it('runs by its npm name', () => {
    write('one-panel.json', ONE_PANEL)
    const env = { ...process.env }
    delete env['INIT_CWD']
    const run = spawnSync('npm', ['--prefix', ROOT, 'run', '--silent', 'appraise', '--', 'one-panel.json'], {
      cwd: folder,
      env,
      encoding: 'utf8',
    })
    expect({ status: run.status, stderr: run.stderr }).toEqual({ status: 0, stderr: '' })
    expect(appraisal.parse(JSON.parse(run.stdout)).format).toBe('bothways.appraisal-result/1')
  })
})
