/** One look for everything that is typed into or chosen from. */
export const controlClass =
  'block w-full min-h-press rounded-press border-2 border-ink bg-paper px-3 py-2 text-15 text-ink aria-invalid:border-flag-text aria-invalid:border-4 disabled:border-dashed disabled:border-ink-soft disabled:text-ink-soft in-data-[place=field]:text-21';
