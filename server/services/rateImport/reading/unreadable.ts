/** Why a file cannot be read, in words for the person who sent it. */
export class UnreadableFileError extends Error {
  constructor(message: string) {
    super(message)
    this.name = 'UnreadableFileError'
  }
}
