import { KeepInDraft } from './keepInDraft'

export class KeepGangInsert1796100000061 extends KeepInDraft {
  constructor() {
    super('gang', 'INSERT')
  }
}
