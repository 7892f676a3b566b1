// The model comes to the browser only when a pass is to be changed.
'use client'
import dynamic from 'next/dynamic'

export const PassMover = dynamic(() => import('./pass-mover'), {
  ssr: false,
  loading: () => (
    <p role="status" className="flex min-h-[208px] items-center text-note text-graphite">
      Fetching tonight’s model…
    </p>
  ),
})
