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
  },
} satisfies Config
