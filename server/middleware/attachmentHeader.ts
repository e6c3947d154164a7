/**
 * Value of `Content-Disposition` (RFC 6266): an ASCII name for old programs, the true name beside it. Whatever a file system or
 * a header could take amiss becomes a space.
 */
export function attachmentHeader(kind: 'inline' | 'attachment', name: string, ending: string): string {
  const clean = name
    .replace(/[\p{Cc}\p{Cf}/\\:*?"<>|%;]/gu, ' ')
    .replace(/ +/g, ' ')
    .trim()
  const [ascii, encoded] = [clean.replace(/[^\x20-\x7e]/g, '_'), encodeURIComponent(`${clean}.${ending}`)]
  return `${kind}; filename="${ascii}.${ending}"; filename*=UTF-8''${encoded.replace(/['()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`)}`
}
