import { z } from 'zod';
import { TOLD_ACTIONS, type ToldAction } from './told-actions';

const ACTIONS = Object.keys(TOLD_ACTIONS) as [ToldAction, ...ToldAction[]];

/** Longest address, characters: what servers commonly take in a request line, with room to spare. */
const LONGEST_URL = 1000;

/** What a person says about a webhook they make. Where its host lies, addressTrouble says. */
export const webhookFormSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Give the webhook a name: what listens there.')
    .max(80, 'Write at most 80 characters.'),
  url: z
    .string()
    .trim()
    .max(LONGEST_URL, `Write at most ${LONGEST_URL} characters.`)
    .superRefine((text, context) => {
      const message = urlTrouble(text);
      if (message) context.addIssue({ code: 'custom', message });
    }),
  actions: z.array(z.enum(ACTIONS)).min(1, 'Choose at least one thing it is told of.')
});

export type WebhookForm = z.output<typeof webhookFormSchema>;

function urlTrouble(text: string): string | null {
  if (!URL.canParse(text)) return 'Write a whole address, such as https://example.org/hook.';
  const { protocol, username, password } = new URL(text);
  if (protocol !== 'https:' && protocol !== 'http:') return 'The address begins with https:// or http://.';
  if (username !== '' || password !== '')
    return 'Leave name and password out of the address: messages are signed instead.';
  return null;
}
