const token = (name) => `var(--${name})`;

/** Only these names exist in class lists: a palette number or another size yields no style at all. */
/** @type {import('tailwindcss').Config} */
const config = {
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(
        [
          'paper',
          'ink',
          'ink-soft',
          'rule',
          'bone',
          'tape-red',
          'flag',
          'flag-text',
          'series-1',
          'series-2',
          'series-3',
          'series-4',
          'series-5',
          'series-6',
        ].map((name) => [name, token(name)]),
      ),
    },
    fontFamily: {
      sans: ['var(--font-words)', 'system-ui', 'sans-serif'],
      mono: ['var(--font-numbers)', 'ui-monospace', 'monospace'],
    },
    fontSize: {
      13: ['0.8125rem', { lineHeight: '1.25rem' }],
      15: ['0.9375rem', { lineHeight: '1.4375rem' }],
      18: ['1.125rem', { lineHeight: '1.625rem' }],
      21: ['1.3125rem', { lineHeight: '1.75rem' }],
      27: ['1.6875rem', { lineHeight: '2.125rem' }],
      34: ['2.125rem', { lineHeight: '2.5rem' }],
    },
    borderRadius: { none: '0', press: '10px' },
    boxShadow: { none: 'none' },
    extend: {
      minHeight: { press: 'var(--press)' },
      minWidth: { press: 'var(--press)' },
      maxWidth: { reading: '42rem', form: '36rem', page: '80rem' },
    },
  },
};

export default config;
