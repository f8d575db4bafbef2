import { useMutation, useQueryClient } from '@tanstack/react-query';
import { signIn } from 'next-auth/react';
import type { SignInFields } from '@/lib/contracts/account';
import { NoAnswerError } from './api-error';

/** Why signing in did not work, as a sentence. */
export class SignInError extends Error {
  override readonly name = 'SignInError';
}

const sentences: Readonly<Record<string, string>> = {
  CredentialsSignin: 'The e-mail address or the password is wrong.',
  TooManyTries: 'Too many tries. Wait some minutes, then try again.',
};

/** Signs in with e-mail address and password; what was fetched for another account before is forgotten. */
export function useSignIn() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async (fields: SignInFields) => {
      const answer = await askNextAuth(fields);
      if (!answer?.ok)
        throw new SignInError(sentences[answer?.error ?? ''] ?? 'Signing in did not work. Try again.');
      queryClient.clear();
    },
  });
}

async function askNextAuth(fields: SignInFields) {
  try {
    return await signIn('credentials', { ...fields, redirect: false });
  } catch (cause) {
    throw new NoAnswerError({ cause });
  }
}
