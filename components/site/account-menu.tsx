'use client';

import { signOut } from 'next-auth/react';
import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { Menu, MenuChoice, MenuItem, MenuLabel, MenuRule } from '@/components/ui/menu';
import { useTheme } from '@/components/ui/theme';
import { useForgetAccount, useMe } from '@/lib/client/use-me';

/** Who is signed in, and what belongs to this person and this device; for nobody, the way to sign in. */
export function AccountMenu({ signedIn }: { signedIn: boolean }) {
  return signedIn ? <SignedIn /> : <SignedOut />;
}

function SignedIn() {
  const { data: me, isPending } = useMe();
  if (isPending) return <span className="w-9" aria-hidden />;
  if (!me) return <SignedOut />;
  return (
    <Menu
      trigger={
        <Button variant="bar" aria-label={`Account of ${me.name}`}>
          <Icon name="person" />
          <span className="hidden max-w-40 truncate sm:inline">{me.name}</span>
        </Button>
      }
    >
      <MenuLabel>
        {me.name}
        <br />
        {me.email}
      </MenuLabel>
      <MenuItem asChild>
        <Link href="/account">
          <Icon name="person" size={18} /> Account
        </Link>
      </MenuItem>
      <MenuRule />
      <ThemeChoices />
      <MenuRule />
      <SignOutItem />
    </Menu>
  );
}

function SignedOut() {
  return (
    <>
      <Menu trigger={<Button variant="bar" aria-label="Light or dark" icon="sun" className="px-2" />}>
        <ThemeChoices />
      </Menu>
      <Button variant="bar" asChild>
        <Link href="/sign-in">Sign in</Link>
      </Button>
    </>
  );
}

function ThemeChoices() {
  const { choice, setChoice } = useTheme();
  return (
    <>
      <MenuLabel>On this device</MenuLabel>
      <MenuChoice
        value={choice}
        onChange={setChoice}
        options={[
          { value: 'light', label: 'Light film', icon: 'sun' },
          { value: 'dark', label: 'Night shift', icon: 'moon' },
          { value: 'device', label: 'As the device asks', icon: 'device' },
        ]}
      />
    </>
  );
}

function SignOutItem() {
  const forget = useForgetAccount();
  return (
    <MenuItem
      icon="out"
      onSelect={() => {
        forget();
        void signOut({ callbackUrl: '/' });
      }}
    >
      Sign out
    </MenuItem>
  );
}
