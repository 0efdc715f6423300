import { createCipheriv, hkdfSync, randomBytes } from 'node:crypto';

/** Key of AES-256-GCM for secrets of webhooks, apart from every other use of the server's key (HKDF, RFC 5869). */
export const sealingKey = (serverSecret: string): Buffer =>
  Buffer.from(hkdfSync('sha256', serverSecret, '', 'severalty: secrets of webhooks', 32));

/**
 * Seals the secret of a webhook, which has to be read again to sign and so cannot be kept as a hash.
 *
 * @param webhookId bound to the seal: a sealed secret moved to another row does not open
 * @returns base64url of nonce (12 bytes), tag (16 bytes) and cipher text
 */
export function sealSecret(secret: string, webhookId: string, serverSecret: string): string {
  const nonce = randomBytes(12);
  const cipher = createCipheriv('aes-256-gcm', sealingKey(serverSecret), nonce).setAAD(
    Buffer.from(webhookId)
  );
  const sealed = Buffer.concat([cipher.update(secret, 'utf8'), cipher.final()]);
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]).toString('base64url');
}
