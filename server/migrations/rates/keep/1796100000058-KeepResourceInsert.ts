import { KeepInDraft } from './keepInDraft'

export class KeepResourceInsert1796100000058 extends KeepInDraft {
  constructor() {
    super('resource', 'INSERT')
  }
}
