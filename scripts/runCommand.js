import { spawn } from 'node:child_process'
import { SetUpError } from './progress.js'

/**
 * Runs a command to its end and yields what it printed; it is ended when this process ends.
 * @throws SetUpError with the last lines of its output when it does not exit with 0
 * @param {string} command
 * @param {readonly string[]} commandArguments
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv }} options
 */
export function runCommand(command, commandArguments, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn('setpriv', ['--pdeathsig', 'TERM', '--', command, ...commandArguments], {
      stdio: ['ignore', 'pipe', 'pipe'],
      ...options,
    })
    let output = ''
    const keep = (chunk) => (output = (output + chunk).slice(-200_000))
    child.stdout.on('data', keep)
    child.stderr.on('data', keep)
    child.once('error', (cause) => reject(new SetUpError(`${command} could not be run: ${cause.message}`)))
    child.once('close', (status) => {
      if (status === 0) resolve(output)
      else
        reject(
          new SetUpError(
            `${command} ${commandArguments.join(' ')} ended with ${status}:\n${output.split('\n').slice(-40).join('\n')}`,
          ),
        )
    })
  })
}
