import { defineEntity, type InferEntity, p } from '@mikro-orm/core';

/** A wrong password, kept as long as it counts against the next try. */
export const SignInFailure = defineEntity({
  name: 'SignInFailure',
  tableName: 'sign_in_failures',
  indexes: [
    { name: 'sign_in_failures_account_index', properties: ['account', 'at'] },
    { name: 'sign_in_failures_address_index', properties: ['address', 'at'] },
    { name: 'sign_in_failures_at_index', properties: ['at'] },
  ],
  properties: {
    id: p.uuid().primary(),
    /** SHA-256 of the e-mail address that was tried, which need not exist. */
    account: p.string().length(64),
    /** The known device it came from, or null. */
    device: p.uuid().nullable(),
    /** SHA-256 of the network address. */
    address: p.string().length(64),
    at: p.datetime(3),
  },
});
export type SignInFailure = InferEntity<typeof SignInFailure>;
