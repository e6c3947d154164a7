import { KeepInDraft } from './keepInDraft'

/** In the place of the trigger before: a rate does not move to another edition either. */
export class KeepRatePlace1796100000067 extends KeepInDraft {
  constructor() {
    super('rate', 'UPDATE')
  }
}
