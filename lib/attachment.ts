import 'server-only';
import type { HashedFile } from './kernel/hashed-file';

/**
 * A file as a download, or to be shown in its place. Its hash is its ETag: a browser that has it
 * already gets 304.
 */
export function attachment(
  request: Request,
  file: Pick<HashedFile, 'name' | 'mediaType' | 'sha256' | 'body'>,
  disposition: 'attachment' | 'inline' = 'attachment',
): Response {
  const etag = `"${file.sha256}"`;
  const headers = {
    ETag: etag,
    'Cache-Control': 'private, no-cache',
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'X-Content-Type-Options': 'nosniff',
    // RFC 6266: a plain name for old clients, the whole one in UTF-8.
    'Content-Disposition': `${disposition}; filename="${file.name.replace(/[^\w.() -]/g, '_')}"; filename*=UTF-8''${encodeName(file.name)}`,
  };
  const known = request.headers.get('if-none-match')?.split(',') ?? [];
  if (known.some((tag) => tag.trim().replace(/^W\//, '') === etag)) {
    return new Response(null, { status: 304, headers });
  }
  return new Response(new Uint8Array(file.body), {
    headers: {
      ...headers,
      'Content-Type': file.mediaType,
      'Content-Length': String(file.body.byteLength),
    },
  });
}

/** RFC 8187: what encodeURIComponent leaves but an extended value may not hold. */
function encodeName(name: string): string {
  return encodeURIComponent(name).replace(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
}
