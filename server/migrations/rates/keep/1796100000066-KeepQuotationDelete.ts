import { KeepInDraft } from './keepInDraft'

export class KeepQuotationDelete1796100000066 extends KeepInDraft {
  constructor() {
    super('quotation', 'DELETE')
  }
}
