import { notFound } from 'next/navigation';

/** Every address that names nothing. It stands in the dynamic group, because the framework's own page would not hydrate under a nonce. */
export default function Missing() {
  notFound();
}
