import { z } from 'zod';

/** A moment as the API writes it: ISO 8601 in UTC, `2031-04-05T06:07:08.009Z`. */
export const moment = z.iso.datetime();

/** Names a row of the database: a UUID. */
export const recordId = z.uuid();

/** Somebody as others see them; never with an e-mail address. */
export const person = z.object({ id: recordId, name: z.string() });
export type Person = z.infer<typeof person>;
