import { authSecret } from '../../auth/auth-secret';
import { readEnv } from '../../env';
import type { WebhookSettings } from './make-webhook';

/** The settings of webhooks in this process. */
export function webhookSettings(): WebhookSettings {
  const env = readEnv();
  return { serverSecret: authSecret(env), allowInner: env.WEBHOOKS_INSIDE === 'yes' };
}
