/** What sessions need to know of the surroundings. */
export interface SessionSettings {
  readonly secret: string
  /** Configured address of the application: issuer, audience and the start of every link in a mail. */
  readonly origin: string
}

/** An access token is good for 10 minutes, a sign-in for 14 days, a used refresh token for 10 s more (two tabs). */
export const ACCESS_S = 600
export const SESSION_S = 14 * 24 * 3600
export const REUSE_MS = 10_000
