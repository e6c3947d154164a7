import type { Role } from '#shared/contracts/person'
import type { Session, SignInInput } from '#shared/contracts/session'
import { defineStore } from 'pinia'
import { computed, shallowRef } from 'vue'
import { ApiFailure } from '../api/apiFailure'
import { readSession, refreshSession, signIn as askToSignIn, signOut as askToSignOut } from '../api/session'

/** Who is signed in. `session` is undefined until it was asked for once, null when nobody is. */
export const useSessionStore = defineStore('session', () => {
  const session = shallowRef<Session | null | undefined>(undefined)
  let renewal: Promise<boolean> | null = null

  const roles = computed<readonly Role[]>(() => session.value?.person.roles ?? [])
  const hasRole = (role: Role) => roles.value.includes(role)

  /** Asks the server who is signed in, renewing an access that has run out. */
  async function load(): Promise<void> {
    session.value = await readSession().catch(async (failure: unknown) => {
      if (!(failure instanceof ApiFailure) || failure.code !== 'unauthenticated') throw failure
      return (await renew()) ? await readSession() : null
    })
  }

  async function refresh(): Promise<boolean> {
    try {
      await refreshSession()
      return true
    } catch (failure) {
      if (failure instanceof ApiFailure && failure.code === 'unauthenticated') return false
      throw failure
    }
  }

  /** One renewal at a time: calls that fail together wait for the same one. */
  function renew(): Promise<boolean> {
    renewal ??= refresh().finally(() => (renewal = null))
    return renewal
  }

  async function signIn(input: SignInInput): Promise<void> {
    session.value = await askToSignIn(input)
  }

  /** Ends the session; one that had run out already is as good as ended. */
  async function signOut(): Promise<void> {
    await askToSignOut().catch((failure: unknown) => {
      if (!(failure instanceof ApiFailure) || failure.code !== 'unauthenticated') throw failure
    })
    session.value = null
  }

  /** The session ended elsewhere or ran out. */
  function forget(): void {
    session.value = null
  }

  return { session, roles, hasRole, load, renew, signIn, signOut, forget }
})
