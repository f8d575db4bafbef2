import { z } from 'zod';

export const health = z.object({ status: z.literal('ok') });
export type Health = z.infer<typeof health>;
