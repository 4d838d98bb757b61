import type { Download } from '@/lib/contract/transfer';

export function downloadResponse(file: Download): Response {
  return new Response(new Uint8Array(file.bytes), {
    headers: {
      ...file.headers,
      'content-type': file.mediaType,
      'content-length': String(file.bytes.byteLength),
      'content-disposition': attachment(file.name),
      'cache-control': 'private, no-store',
      'x-content-type-options': 'nosniff',
    },
  });
}

/** A file name for both old and new readers (RFC 6266, RFC 8187). */
export function attachment(name: string): string {
  const plain =
    name
      .normalize('NFKD')
      .replace(/[^\x20-\x7e]/g, '')
      .replace(/["\\%]/g, '_') || 'file';
  const exact = encodeURIComponent(name.replace(/\p{Surrogate}/gu, '_')).replace(
    /['()*]/g,
    (c) => '%' + c.charCodeAt(0).toString(16).toUpperCase(),
  );
  return `attachment; filename="${plain}"; filename*=UTF-8''${exact}`;
}
