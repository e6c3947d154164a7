import { BuildUpRefusedError } from '#shared/pricing/buildUpRefused'
import { AppError } from '../../errors'

/**
 * Result of working a build-up out. What it names that is not there becomes a refusal under `buildUp`, with the path of each line.
 * @throws AppError `invalid_request`
 */
export function rateRefused<T>(work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (!(error instanceof BuildUpRefusedError)) throw error
    const issues = error.issues.map(({ path, message }) => ({
      path: ['buildUp', path].filter((step) => step !== '').join('.'),
      message,
    }))
    throw new AppError('invalid_request', undefined, issues)
  }
}
