import argon2 from 'argon2'
import { AppError } from '../../errors'

/** Source: OWASP Password Storage Cheat Sheet, Argon2id with 19 MiB, t = 2, p = 1. */
const PARAMETERS = { type: argon2.argon2id, memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 } as const

/** Hashes run on the threads that also read files and names: two at a time leave the rest of the server alone. */
const PARALLEL = 2
const MOST_WAITING = 64

let running = 0
const waiting: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= PARALLEL) {
    if (waiting.length >= MOST_WAITING) throw new AppError('unavailable', 'Too many people sign in at once.', undefined, 2)
    await new Promise<void>((resolve) => waiting.push(resolve))
  } else {
    running++
  }
  try {
    return await work()
  } finally {
    const next = waiting.shift()
    if (next) next()
    else running--
  }
}

/** Argon2id of the password with its parameters and salt, as text. @throws AppError `unavailable` when too many wait */
export async function hashPassword(password: string): Promise<string> {
  return await inTurn(() => argon2.hash(password, PARAMETERS))
}

let nobodys: Promise<string> | undefined

/**
 * True when the password belongs to the hash. Without a hash a random one is tried, so that nobody's password takes as long as
 * somebody's.
 * @throws AppError `unavailable` when too many wait
 */
export async function isPassword(hash: string | null, password: string): Promise<boolean> {
  nobodys ??= argon2.hash(crypto.randomUUID(), PARAMETERS)
  const tried = hash ?? (await nobodys)
  const isRight = await inTurn(() => argon2.verify(tried, password))
  return isRight && hash !== null
}
