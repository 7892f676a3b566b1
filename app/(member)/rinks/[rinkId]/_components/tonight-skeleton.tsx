// The outline of the whole page while it is on its way: header, verdict, then the sheet.
import { SheetSkeleton } from './sheet-skeleton'

export function TonightSkeleton() {
  return (
    <div className="mx-auto max-w-page px-5 pb-24 lg:px-9 lg:pb-12">
      <p role="status" className="sr-only">
        Reading tonight’s sheet…
      </p>
      <div aria-hidden="true">
        <div className="h-[62px] border-b border-rule" />
        <div className="mt-7 mb-2 h-[68px] max-w-[22ch] lg:h-[92px]">
          <Bar className="h-6 w-[300px] lg:h-9 lg:w-[560px]" />
          <Bar className="mt-3 h-6 w-[220px] lg:h-9 lg:w-[380px]" />
        </div>
        <div className="mb-5 h-[51px] pt-1.5 lg:h-[26px]">
          <Bar className="h-3.5 w-[280px] lg:w-[480px]" />
        </div>
        <SheetSkeleton />
      </div>
    </div>
  )
}

function Bar({ className }: { className: string }) {
  return <div className={`max-w-full bg-night ${className}`} />
}
