import type { Dispatch, DispatchState } from '#shared/contracts/dispatch'
import { formatDay, formatTime } from '../base/formatMoment'
import type { IconName } from '../base/BaseIcon.vue'

const when = (moment: string) => `${formatDay(moment)}, ${formatTime(moment)}`

export const STATE_ICONS: Record<DispatchState, IconName> = { queued: 'mail', sent: 'check', refused: 'cross', failed: 'error' }

/** The state of a dispatch as a word. */
export const STATE_WORDS: Record<DispatchState, string> = { queued: 'queued', sent: 'sent', refused: 'refused', failed: 'failed' }

/** What happened to a dispatch, in a sentence, with what the mail server said where it was not yes. */
export function dispatchInWords({ state, tries, lastAnswer, createdAt, sentAt }: Dispatch): string {
  const said = lastAnswer === null ? '' : ` The mail server said: ${lastAnswer}`
  switch (state) {
    case 'queued':
      return tries === 0 ? `Waiting to go out since ${when(createdAt)}.` : `Tried ${times(tries)}, tried again by itself.${said}`
    case 'sent':
      return `Accepted by the mail server on ${when(sentAt ?? createdAt)}.`
    case 'refused':
      return `The mail server will not take it. Check the address and send it again.${said}`
    case 'failed':
      return `Given up after ${times(tries)}. Send it again when the mail server answers.${said}`
  }
}

function times(count: number): string {
  return count === 1 ? 'once' : `${count} times`
}
