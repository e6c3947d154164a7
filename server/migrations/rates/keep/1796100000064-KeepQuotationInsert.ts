import { KeepInDraft } from './keepInDraft'

export class KeepQuotationInsert1796100000064 extends KeepInDraft {
  constructor() {
    super('quotation', 'INSERT')
  }
}
