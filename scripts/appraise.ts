import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { AppraisalRefusedError } from '#shared/appraisalRefused'
import { appraise } from '#shared/appraise'
import type { ApiError } from '#shared/contracts/apiError'
import { OutOfScopeError } from '#shared/outOfScope'
import { parseAppraisalFile } from '#shared/parseAppraisalFile'

/** Exit status for input that cannot be appraised. */
const BAD_INPUT = 2

/** Input that cannot be read: what stands on stderr, in the one shape of errors. */
class RefusedInput extends Error {
  constructor(readonly body: Omit<ApiError, 'requestId'>) {
    super(body.message)
  }
}

/** `npm run --silent appraise -- FILE.json`: the result as JSON on stdout, or the error body on stderr and exit status 2. */
function main(args: readonly string[]): void {
  try {
    const result = appraise(parseAppraisalFile(readJson(args)))
    process.stdout.write(`${JSON.stringify(result, null, 2)}\n`)
  } catch (error) {
    const body: ApiError = { ...refusalOf(error), requestId: 'command' }
    process.stderr.write(`${JSON.stringify(body, null, 2)}\n`)
    process.exitCode = BAD_INPUT
  }
}

/** The one file named, read from the caller's folder: npm changes the current one and leaves the caller's in INIT_CWD. */
function readJson(args: readonly string[]): unknown {
  const [file, ...more] = args
  if (file === undefined || more.length > 0) {
    throw new RefusedInput({ code: 'invalid_request', message: 'expected one file: npm run --silent appraise -- FILE.json' })
  }
  const text = readText(resolve(process.env['INIT_CWD'] ?? process.cwd(), file), file)
  try {
    return JSON.parse(text)
  } catch (error) {
    throw new RefusedInput({ code: 'invalid_request', message: `${file}: expected JSON; ${(error as SyntaxError).message}` })
  }
}

function readText(path: string, file: string): string {
  try {
    return readFileSync(path, 'utf8')
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException
    if (code === 'ENOENT') throw new RefusedInput({ code: 'not_found', message: `${file}: expected a file, found none` })
    throw new RefusedInput({ code: 'invalid_request', message: `${file}: expected a file that can be read (${code})` })
  }
}

/** @throws what it is given, when that is not the input's fault */
function refusalOf(error: unknown): Omit<ApiError, 'requestId'> {
  if (error instanceof RefusedInput) return error.body
  if (error instanceof AppraisalRefusedError) {
    return { code: 'invalid_request', message: 'the appraisal file cannot be appraised as it stands', issues: [...error.issues] }
  }
  if (error instanceof OutOfScopeError) {
    const issues = [{ path: error.path, message: error.expected }]
    return { code: 'out_of_scope', message: 'the appraisal file asks for something outside the scope of its rules', issues }
  }
  throw error
}

main(process.argv.slice(2))
