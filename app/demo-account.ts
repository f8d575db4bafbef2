export interface DemoAccount {
  readonly email: string;
  readonly password: string;
}

/**
 * The demo's account, where the server was started with one: `SPINDLEAF_DEMO_EMAIL` and `SPINDLEAF_DEMO_PASSWORD`. It
 * is shown to everybody, so it must open nothing but the demo.
 */
export function demoAccount(): DemoAccount | null {
  const { SPINDLEAF_DEMO_EMAIL: email, SPINDLEAF_DEMO_PASSWORD: password } = process.env;
  return email && password ? { email, password } : null;
}
