import type { IncomingMessage } from 'node:http';

/**
 * Lets a mail program end mail by one click (RFC 8058): its POST to the address in the mail carries no Origin, and Kit
 * would take that for a forged form, before any hook. Nothing rides on a cookie there: the token in the address is all.
 */
export function nameOrigin(request: IncomingMessage, address: string): void {
  if (request.method === 'POST' && /^\/unsubscribe\/[\w.-]+$/.test(request.url ?? ''))
    request.headers.origin ??= new URL(address).origin;
}
