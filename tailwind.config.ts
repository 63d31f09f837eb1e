import type { Config } from 'tailwindcss'

const token = (name: string) => `rgb(var(--${name}) / <alpha-value>)`

export default {
  content: ['./app/**/*.{vue,ts}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: token('paper'),
      ink: token('ink'),
      muted: token('muted'),
      hairline: token('hairline'),
      water: token('water'),
      bottom: token('bottom'),
      rust: token('rust'),
      kelp: token('kelp'),
      brass: token('brass'),
    },
    fontFamily: {
      serif: ['Lora', 'Georgia', 'serif'],
      sans: ['"Source Sans 3"', 'system-ui', 'sans-serif'],
    },
    // The six sizes of the book: nothing is set in any other.
    fontSize: {
      label: ['0.8125rem', { lineHeight: '1.35' }],
      table: ['0.9375rem', { lineHeight: '1.45' }],
      prose: ['1.0625rem', { lineHeight: '1.62' }],
      lead: ['1.3125rem', { lineHeight: '1.4' }],
      sentence: ['1.6875rem', { lineHeight: '1.75' }],
      title: ['2.5rem', { lineHeight: '1.15' }],
    },
    fontWeight: { normal: 'var(--body-weight)', semibold: '600' },
    borderRadius: { none: '0' },
    boxShadow: { none: 'none' },
    extend: {
      maxWidth: { measure: '38rem', page: '72rem' },
      borderWidth: { rule: 'var(--rule)' },
      minHeight: { touch: '2.75rem' },
    },
  },
} satisfies Config
