import { KeepInDraft } from './keepInDraft'

export class KeepResourceUpdate1796100000059 extends KeepInDraft {
  constructor() {
    super('resource', 'UPDATE')
  }
}
