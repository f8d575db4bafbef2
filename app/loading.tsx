import { LoadingState } from '@/components/ui/states';

export default function Loading() {
  return (
    <main id="main">
      <LoadingState title="Opening …" />
    </main>
  );
}
