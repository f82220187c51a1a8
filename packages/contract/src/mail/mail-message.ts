import { z } from 'zod';

export const mailMessage = z.object({
  id: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
  receivedAt: z.string(),
});
export type MailMessage = z.infer<typeof mailMessage>;
