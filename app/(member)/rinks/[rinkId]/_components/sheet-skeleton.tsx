// The outline of the night sheet, as tall as the sheet itself, so that nothing jumps when it fills.

export function SheetSkeleton() {
  return (
    <div aria-hidden="true">
      <div className="-mx-5 border-y border-rule bg-sheet pt-3 lg:mx-0 lg:border-x">
        <svg viewBox="0 0 800 274" className="hidden w-full min-[720px]:block">
          <path d="M34,214 H756" className="stroke-rule" />
        </svg>
        <svg viewBox="0 0 390 268" className="w-full min-[720px]:hidden">
          <path d="M34,208 H350" className="stroke-rule" />
        </svg>
        <div className="h-[104px]" />
      </div>
      <div className="lg:grid lg:grid-cols-[1.25fr_1fr] lg:gap-x-14">
        <Lines count={3} />
        <Lines count={4} />
      </div>
    </div>
  )
}

function Lines({ count }: { count: number }) {
  return (
    <div className="mt-[66px] border-t border-rule">
      {Array.from({ length: count }, (_, index) => (
        <div key={index} className="h-[76px] border-b border-rule" />
      ))}
    </div>
  )
}
