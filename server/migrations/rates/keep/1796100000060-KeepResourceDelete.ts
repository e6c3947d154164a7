import { KeepInDraft } from './keepInDraft'

export class KeepResourceDelete1796100000060 extends KeepInDraft {
  constructor() {
    super('resource', 'DELETE')
  }
}
