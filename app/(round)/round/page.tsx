import { RoundApp } from '@/components/round/round-app';

// One page without a server behind it: everything it shows comes out of the phone's own store.
export const dynamic = 'force-static';

export default function Page() {
  return <RoundApp />;
}
