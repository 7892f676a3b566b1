// Small drawings of what keeps wind from a rink, seen from the side: the sheet is the thick line, wind comes from the left.
import type { ReactNode } from 'react'

function Picture({ children }: { children: ReactNode }) {
  return (
    <svg
      viewBox="0 0 96 40"
      className="h-10 w-24 shrink-0 text-graphite"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
    >
      <path d="M2 36H94" />
      <path d="M38 36H74" className="stroke-ink" strokeWidth="4" />
      {children}
    </svg>
  )
}

const wind = (y: number, length: number) => `M4 ${y}H${4 + length}m-4 -3l4 3l-4 3`

export const SHELTER_PICTURES = {
  open: (
    <Picture>
      <path d={wind(10, 66)} />
      <path d={wind(20, 66)} />
      <path d={wind(29, 66)} />
    </Picture>
  ),
  suburban: (
    <Picture>
      <path d={wind(8, 66)} />
      <path d={wind(29, 8)} />
      <path d="M18 36V24l7 -6l7 6V36M84 36V22M84 24a6 6 0 1 0 -0.1 0" />
    </Picture>
  ),
  tight: (
    <Picture>
      <path d={wind(6, 66)} />
      <path d="M16 36V19l9 -8l9 8V36M78 36V19l8 -8l8 8V36" />
    </Picture>
  ),
} as const
