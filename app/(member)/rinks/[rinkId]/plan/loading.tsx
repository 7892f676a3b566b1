// The outline of the building plan while it is read.
export default function PlanLoading() {
  return (
    <div role="status" className="noscript:hidden">
      <span className="sr-only">Reading the plan</span>
      <div aria-hidden="true" className="motion-safe:animate-pulse">
        <div className="mb-6 h-[102px] max-w-[22ch] bg-rule/40 text-verdict lg:h-[92px] lg:text-verdict-wide" />
        <div className="-mx-5 h-[300px] border-y border-rule bg-sheet lg:mx-0 lg:h-[390px] lg:border-x" />
        <div className="mt-8 gap-x-14 lg:grid lg:grid-cols-[1.25fr_1fr]">
          <div className="h-[560px] bg-rule/40" />
          <div className="mt-8 h-[560px] bg-rule/40 lg:mt-0" />
        </div>
      </div>
    </div>
  )
}
