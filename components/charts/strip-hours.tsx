// The hours of the strip as one choice: a touch, a drag, or the arrow keys open an hour. Lies over the drawing.
'use client'
import { useEffect, useRef, type KeyboardEvent, type PointerEvent } from 'react'
import type { StripLayout } from './night-strip-layout'

interface StripHoursProps {
  layout: StripLayout
  label: string
  /** Name of an hour, by its index. */
  nameOf: (index: number) => string
  /** Null while no hour is open; `start` is where the keyboard begins then. */
  selected: number | null
  start: number
  onSelect: (index: number | null) => void
}

const STEPS: Record<string, number> = {
  ArrowRight: 1,
  ArrowDown: 1,
  ArrowLeft: -1,
  ArrowUp: -1,
  PageDown: 3,
  PageUp: -3,
  Home: -99,
  End: 99,
}

export function StripHours({ layout, label, nameOf, selected, start, onSelect }: StripHoursProps) {
  const { frame, columns } = layout
  const svg = useRef<SVGSVGElement>(null)
  const isMoving = useRef(false)
  const places = columns.map((column) => column.index)
  const reachable = [selected, start].find((index) => index !== null && places.includes(index)) ?? places[0]

  // Focus follows the hour that the keys chose, and only then.
  useEffect(() => {
    if (!isMoving.current) return
    isMoving.current = false
    svg.current?.querySelector<SVGElement>('[aria-selected="true"]')?.focus()
  }, [selected])

  function moveByKey(event: KeyboardEvent) {
    if (event.key === 'Escape') return onSelect(null)
    const step = STEPS[event.key] ?? (event.key === 'Enter' || event.key === ' ' ? 0 : undefined)
    if (step === undefined || reachable === undefined) return
    event.preventDefault()
    const from = selected === null ? places.indexOf(reachable) : places.indexOf(reachable) + step
    isMoving.current = true
    onSelect(places[Math.min(Math.max(from, 0), places.length - 1)] ?? null)
  }

  function openUnderPointer(event: PointerEvent<SVGSVGElement>) {
    if (event.type === 'pointermove' && event.buttons === 0) return
    const box = event.currentTarget.getBoundingClientRect()
    const x = ((event.clientX - box.left) / box.width) * frame.width
    const column = columns.find((each) => x >= each.x && x < each.x + each.width)
    if (column && column.index !== selected) onSelect(column.index)
  }

  return (
    <svg
      ref={svg}
      viewBox={`0 0 ${frame.width} ${frame.height}`}
      role="listbox"
      aria-label={label}
      aria-orientation="horizontal"
      className="absolute inset-0 h-full w-full cursor-pointer touch-pan-y"
      onPointerDown={openUnderPointer}
      onPointerMove={openUnderPointer}
      onKeyDown={moveByKey}
    >
      {columns.map(({ index, x, width }) => (
        <rect
          key={index}
          role="option"
          aria-label={nameOf(index)}
          aria-selected={index === selected}
          tabIndex={index === reachable ? 0 : -1}
          x={x}
          y={frame.plotTop}
          width={width}
          height={frame.plotBottom - frame.plotTop + 19}
          fill="transparent"
          strokeWidth={1.6}
          className="stroke-transparent outline-none focus-visible:stroke-hose focus-visible:[stroke-width:3] aria-selected:stroke-ink"
        />
      ))}
    </svg>
  )
}
