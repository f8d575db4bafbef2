import { demoAccount } from '../../demo-account';
import { SignInForm } from '@/components/account/sign-in-form';
import { returnPath } from '@/lib/client/return-path';

export const metadata = { title: 'Sign in' };

interface SignInPageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { callbackUrl, ended } = await searchParams;
  return (
    <SignInForm
      demo={demoAccount()}
      returnTo={returnPath(typeof callbackUrl === 'string' ? callbackUrl : null)}
      ended={ended !== undefined}
    />
  );
}
