// Prints the page as its print style lays it out. Without script the browser's own menu does the same.
'use client'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { Button } from './button'

export function PrintButton({ children }: { children: string }) {
  const isHydrated = useHydrated()
  if (!isHydrated) return null
  return (
    <Button className="print:hidden" onClick={() => window.print()}>
      {children}
    </Button>
  )
}
