// The tokens of the look: components use these names, never raw values.
import type { Config } from 'tailwindcss'

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        paper: 'var(--paper)',
        sheet: 'var(--sheet)',
        ink: 'var(--ink)',
        graphite: 'var(--graphite)',
        rule: 'var(--rule)',
        lamp: 'var(--lamp)',
        // Lamp at the contrast that text needs.
        'lamp-text': 'var(--lamp-text)',
        hose: 'var(--hose)',
        still: 'var(--still)',
        rust: 'var(--rust)',
        night: 'var(--night)',
      },
      fontFamily: { sans: ['var(--font-plex-sans)', 'system-ui', 'sans-serif'] },
      fontSize: {
        small: ['13px', '1.45'],
        note: ['15px', '1.5'],
        body: ['17px', '1.5'],
        lead: ['21px', '1.35'],
        verdict: ['28px', '1.22'],
        'verdict-wide': ['40px', '1.15'],
        // On paper at the gate.
        sign: ['72px', '1.1'],
        'sign-name': ['44px', '1.2'],
      },
      maxWidth: { line: '68ch', page: '1180px' },
      minHeight: { touch: '48px' },
      minWidth: { touch: '48px' },
    },
  },
}

export default config
