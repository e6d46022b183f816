import { connection } from 'next/server';
import type { ReactNode } from 'react';
import { QueryProvider } from '@/lib/client/query-provider';

/** Desk pages are made anew at each request, so that the nonce of the answer's policy stands in their scripts. */
export default async function DeskLayout({ children }: { children: ReactNode }) {
  await connection();
  return <QueryProvider>{children}</QueryProvider>;
}
