import type { Config } from 'tailwindcss';

/** The tokens. Their values, light and dark, are the variables in app/globals.css. */
const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      lime: 'var(--lime)',
      leaf: 'var(--leaf)',
      ink: 'var(--ink)',
      slate: 'var(--slate)',
      hair: 'var(--hair)',
      cord: 'var(--cord)',
      umber: 'var(--umber)',
      brass: 'var(--brass)',
      moss: 'var(--moss)',
      tint: 'var(--tint)',
    },
    fontFamily: {
      sans: ['"Source Sans 3"', 'system-ui', 'sans-serif'],
    },
    // 14, 16, 20 and 28 px, in rem so that they follow the reader's own setting.
    fontSize: {
      sm: ['0.875rem', { lineHeight: '1.45' }],
      base: ['1rem', { lineHeight: '1.45' }],
      lg: ['1.25rem', { lineHeight: '1.25' }],
      xl: ['1.75rem', { lineHeight: '1.2' }],
    },
    fontWeight: { normal: '400', semibold: '600' },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    boxShadow: { none: 'none', lift: '0 4px 16px rgb(0 0 0 / 0.16)' },
  },
};

export default config;
