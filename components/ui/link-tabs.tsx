import Link from 'next/link';

export type LinkTab = { label: string; href: string; current: boolean };

type LinkTabsProps = { label: string; tabs: readonly LinkTab[] };

/** Pages beside each other, as links: each has an address, and the back button works. */
export function LinkTabs({ label, tabs }: LinkTabsProps) {
  return (
    <nav aria-label={label} className="border-b border-rule" data-print="leave-out">
      <ul className="flex flex-wrap gap-x-5">
        {tabs.map((tab) => (
          <li key={tab.href}>
            <Link
              href={tab.href}
              aria-current={tab.current ? 'page' : undefined}
              className="flex min-h-press items-center border-b-4 border-transparent text-15 text-ink hover:border-rule aria-[current=page]:border-ink aria-[current=page]:font-bold"
            >
              {tab.label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
