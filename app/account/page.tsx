import { redirect } from 'next/navigation';
import { AccountPage } from '@/components/account/account-page';
import { AppHeader } from '@/components/site/app-header';
import { pagePrincipal } from '@/lib/server/auth/request-principal';

export const metadata = { title: 'Account' };

export default async function Account() {
  if (!(await pagePrincipal())) redirect('/sign-in?callbackUrl=/account');
  return (
    <>
      <AppHeader />
      <AccountPage />
    </>
  );
}
