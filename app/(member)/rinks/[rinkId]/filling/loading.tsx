// The outline of the Filling page while it is read.
export default function FillingLoading() {
  return (
    <div role="status" className="noscript:hidden">
      <span className="sr-only">Reading how the fill stands</span>
      <div aria-hidden="true" className="motion-safe:animate-pulse">
        <div className="h-[68px] max-w-[22ch] bg-rule/40 text-verdict lg:h-[92px] lg:text-verdict-wide" />
        <div className="mt-3 mb-5 h-[51px] max-w-[60ch] bg-rule/40" />
        <div className="h-[72px] border-y border-rule bg-sheet" />
        <div className="mt-8 gap-x-14 lg:grid lg:grid-cols-2">
          <div className="h-[320px] bg-rule/40" />
          <div className="mt-8 h-[320px] bg-rule/40 lg:mt-0" />
        </div>
      </div>
    </div>
  )
}
