import type { Response } from 'express'

/** Says that the answer is a file to be kept under this name; it is never shown by the browser itself. */
export function attachment(response: Response, type: string, fileName: string): void {
  const plain = fileName.replace(/[^\w.-]+/g, '-')
  response.set({
    'Content-Type': type,
    'Content-Disposition': `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(fileName)}`,
    'X-Content-Type-Options': 'nosniff',
    'Content-Security-Policy': "sandbox; default-src 'none'",
  })
}
