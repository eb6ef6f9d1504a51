import typography from '@tailwindcss/typography';
import type { Config } from 'tailwindcss';

/** The book's named colours: each is a token of src/styles/main.css, where paper and garage give it its value. */
export default {
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ground: 'var(--ground)',
      plate: 'var(--plate)',
      ink: 'var(--ink)',
      'soft-ink': 'var(--soft-ink)',
      rule: 'var(--rule)',
      oxide: 'var(--oxide)',
      'on-oxide': 'var(--on-oxide)',
      link: 'var(--link)',
      settled: 'var(--settled)',
      'signal-danger': 'var(--signal-danger)',
      'signal-warning': 'var(--signal-warning)',
      'signal-caution': 'var(--signal-caution)',
      'signal-notice': 'var(--signal-notice)',
      'on-danger': 'var(--on-danger)',
      'on-warning': 'var(--on-warning)',
      'on-caution': 'var(--on-caution)',
      'on-notice': 'var(--on-notice)',
    },
    fontFamily: { serif: ['Merriweather', 'Georgia', 'serif'] },
    fontSize: {
      table: ['0.9375rem', '1.375rem'],
      text: ['1.0625rem', '1.75rem'],
      'head-3': ['1.3125rem', '1.75rem'],
      'head-2': ['1.6875rem', '2.125rem'],
      'head-1': ['2.1875rem', '2.625rem'],
    },
    extend: { maxWidth: { measure: '68ch' } },
  },
  plugins: [typography],
} satisfies Config;
