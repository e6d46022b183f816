export type PressLook = 'primary' | 'secondary' | 'quiet';

const shared =
  'inline-flex min-h-press min-w-press items-center justify-center rounded-press border-2 py-2 text-center text-15 font-bold leading-tight no-underline in-data-[place=field]:text-18';

const looks: Record<PressLook, string> = {
  primary: 'px-4 border-ink bg-ink text-paper hover:bg-ink/85',
  secondary: 'px-4 border-ink bg-transparent text-ink hover:bg-bone',
  quiet: 'px-2 border-transparent bg-transparent text-ink underline underline-offset-4 hover:bg-bone',
};

/** One look for everything that is pressed, whether it is a button or a link. */
export function pressClass(look: PressLook, wide: boolean): string {
  return `${shared} ${looks[look]} ${wide ? 'w-full' : ''}`;
}
