import { KeepInDraft } from './keepInDraft'

export class KeepGangDelete1796100000063 extends KeepInDraft {
  constructor() {
    super('gang', 'DELETE')
  }
}
