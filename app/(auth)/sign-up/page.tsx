import { SignUpForm } from '@/components/account/sign-up-form';

export const metadata = { title: 'Make an account' };

export default function SignUpPage() {
  return <SignUpForm />;
}
