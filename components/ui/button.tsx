// Buttons and links that look like buttons: 48 px high, readable with gloves on.
import Link, { type LinkProps } from 'next/link'
import type { ButtonHTMLAttributes, ReactNode } from 'react'

type Look = 'main' | 'plain' | 'quiet'

const SHAPE =
  'inline-flex min-h-touch shrink-0 items-center justify-center gap-2 rounded px-[18px] font-medium disabled:cursor-not-allowed disabled:opacity-60'
const LOOKS: Record<Look, string> = {
  main: 'border-[1.5px] border-ink bg-ink text-paper',
  plain: 'border-[1.5px] border-ink bg-transparent text-ink',
  quiet: 'text-ink underline',
}

export function Button({
  look = 'plain',
  className = '',
  ...rest
}: ButtonHTMLAttributes<HTMLButtonElement> & { look?: Look }) {
  return <button type="button" className={`${SHAPE} ${LOOKS[look]} cursor-pointer ${className}`} {...rest} />
}

export function ButtonLink<T extends string>({
  look = 'plain',
  className = '',
  ...rest
}: LinkProps<T> & { look?: Look; className?: string; children: ReactNode }) {
  return <Link className={`${SHAPE} ${LOOKS[look]} no-underline ${className}`} {...rest} />
}
