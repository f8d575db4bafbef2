import 'server-only';

/** Who asks: an account with the session it asks through, which was alive when it was read. */
export interface Principal {
  readonly userId: string;
  readonly sessionId: string;
  readonly name: string;
  readonly email: string;
}
