// The outline of the nights ahead while they are read.
export default function WeekLoading() {
  return (
    <div role="status">
      <span className="sr-only">Reading the nights ahead</span>
      <div aria-hidden="true" className="motion-safe:animate-pulse">
        <div className="h-[68px] max-w-[22ch] bg-rule/40 text-verdict lg:h-[92px] lg:text-verdict-wide" />
        <div className="mt-3 mb-5 h-[51px] max-w-[60ch] bg-rule/40" />
        <div className="-mx-5 border-t border-rule bg-sheet lg:mx-0 lg:border-x">
          {Array.from({ length: 10 }, (_, index) => (
            <div key={index} className="h-[153px] border-b border-rule lg:h-[67px]" />
          ))}
        </div>
      </div>
    </div>
  )
}
