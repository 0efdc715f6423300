import { createDecipheriv } from 'node:crypto';
import { sealingKey } from './seal-secret';

/** The secret that sealSecret sealed; null when the server's key is another one now, or the row was tampered with. */
export function openSecret(sealed: string, webhookId: string, serverSecret: string): string | null {
  const bytes = Buffer.from(sealed, 'base64url');
  if (bytes.length < 28) return null;
  try {
    const opener = createDecipheriv('aes-256-gcm', sealingKey(serverSecret), bytes.subarray(0, 12), {
      authTagLength: 16
    });
    opener.setAAD(Buffer.from(webhookId)).setAuthTag(bytes.subarray(12, 28));
    return Buffer.concat([opener.update(bytes.subarray(28)), opener.final()]).toString('utf8');
  } catch {
    return null;
  }
}
