import { KeepInDraft } from './keepInDraft'

export class KeepQuotationUpdate1796100000065 extends KeepInDraft {
  constructor() {
    super('quotation', 'UPDATE')
  }
}
