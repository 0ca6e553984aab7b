import type { Config } from 'tailwindcss';

/** Tokens live as CSS variables in src/styles.css, so that the dark theme changes them in one place. */
export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        paper: 'var(--paper)',
        card: 'var(--card)',
        ink: 'var(--ink)',
        muted: 'var(--muted)',
        rule: 'var(--rule)',
        edge: 'var(--edge)',
        wash: 'var(--wash)',
        petrol: { DEFAULT: 'var(--petrol)', ink: 'var(--petrol-ink)', wash: 'var(--petrol-wash)' },
        danger: { DEFAULT: 'var(--danger)', wash: 'var(--danger-wash)' },
        warn: { DEFAULT: 'var(--warn)', wash: 'var(--warn-wash)' },
        plate: {
          DEFAULT: 'var(--plate)',
          ink: 'var(--plate-ink)',
          muted: 'var(--plate-muted)',
          edge: 'var(--plate-edge)',
        },
        // ISO 3864 safety colours by their RAL values, from memory; fills with white (yellow: ink) text in both themes
        signal: {
          red: '#9B2423',
          green: '#237F52',
          yellow: '#F9A800',
          blue: '#005387',
          black: '#2B2B2C',
          grey: '#6B6F73',
        },
        mark: {
          red: 'var(--mark-red)',
          green: 'var(--mark-green)',
          yellow: 'var(--mark-yellow)',
          blue: 'var(--mark-blue)',
          black: 'var(--mark-black)',
          grey: 'var(--mark-grey)',
        },
      },
      fontFamily: {
        sans: ['"IBM Plex Sans"', 'system-ui', 'sans-serif'],
        mono: ['"IBM Plex Mono"', 'ui-monospace', 'monospace'],
      },
      minHeight: { target: '3rem' },
    },
  },
} satisfies Config;
