import type { Request, Response } from 'express'
import { randomUUID } from 'node:crypto'
import multer, { diskStorage, MulterError } from 'multer'
import { AppError, refuse } from '../errors'
import { TABLE_LIMITS } from '../services/rateImport/reading/tableLimits'
import { extensionOf, type UploadedFile } from '../services/rateImport/startImport'

/** What the frame of a form adds to its file. */
const FRAME_BYTES = 16 * 1024
const CUT_AFTER_MS = 500
const MEGABYTES = TABLE_LIMITS.fileBytes / 1024 / 1024

const tooLarge = () => new AppError('too_large', `The file is larger than ${MEGABYTES} MB. Save only the list, without pictures.`)

/** The error of a form as the caller may see it. */
function uploadError(error: unknown): unknown {
  if (error instanceof MulterError) {
    if (error.code === 'LIMIT_FILE_SIZE') return tooLarge()
    return refuse('file', `expected one file in the field "file" and nothing else: ${error.message}`)
  }
  const isForm = error instanceof Error && /boundary|multipart|unexpected end of form|malformed/i.test(error.message)
  return isForm ? new AppError('invalid_request', 'The form with the file is broken off or damaged.') : error
}

/**
 * Refuses a request as soon as more has come than a file may have, without waiting for the rest; the sender has a moment to read the
 * answer, then the line is cut, on which what was kept is removed.
 */
function refuseLong(request: Request, response: Response, refuseWith: (error: AppError) => void): void {
  let bytes = 0
  request.on('data', function count(piece: Buffer) {
    bytes += piece.length
    if (bytes <= TABLE_LIMITS.fileBytes + FRAME_BYTES) return
    request.off('data', count)
    response.once('finish', () => setTimeout(() => request.destroy(), CUT_AFTER_MS).unref())
    refuseWith(tooLarge())
  })
}

/**
 * The one file of a form, on disk under a name of ours; what is left of a refused one is removed. A size that is told beforehand is
 * refused at once, any other as soon as it is passed.
 * @param folder - must exist
 * @throws AppError `too_large`, `invalid_request`
 */
export async function uploadedFile(request: Request, response: Response, folder: string): Promise<UploadedFile> {
  if (Number(request.get('content-length') ?? '0') > TABLE_LIMITS.fileBytes + FRAME_BYTES) throw tooLarge()
  const take = multer({
    storage: diskStorage({ destination: folder, filename: (_request, _file, done) => done(null, `${randomUUID()}.upload`) }),
    defParamCharset: 'utf8',
    limits: {
      ...{ fileSize: TABLE_LIMITS.fileBytes, files: 1, fields: 0, parts: 2, headerPairs: 20, fieldNameSize: 20 },
      ...{ fieldNestingDepth: 1, fieldArrayIndexLimit: 0 },
    },
    fileFilter: (_request, file, done) => {
      try {
        extensionOf(file.originalname)
        done(null, true)
      } catch (cause) {
        done(cause as Error)
      }
    },
  }).single('file')
  await new Promise<void>((resolve, reject) => {
    refuseLong(request, response, reject)
    take(request, response, (error: unknown) => (error === undefined ? resolve() : reject(uploadError(error) as Error)))
  })
  if (request.file === undefined) throw refuse('file', 'expected one file in the field "file"')
  return { path: request.file.path, fileName: request.file.originalname }
}
