import { demoAccount } from '../demo-account';
import { Landing } from '@/components/site/landing/landing';

export default function LandingPage() {
  return <Landing demo={demoAccount()} />;
}
