import { KeepInDraft } from './keepInDraft'

export class KeepGangUpdate1796100000062 extends KeepInDraft {
  constructor() {
    super('gang', 'UPDATE')
  }
}
