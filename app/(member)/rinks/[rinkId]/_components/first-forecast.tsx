// Before the first forecast: the shape of the page to come, and what is going on.
import { SheetSkeleton } from './sheet-skeleton'

export function FirstForecast({ hasFailed }: { hasFailed: boolean }) {
  return (
    <>
      <div role="status">
        <h1 className="mt-7 mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
          {hasFailed ? 'The first forecast could not be read.' : 'Reading the first forecast…'}
        </h1>
        <p className="mb-5 max-w-[60ch] text-graphite">
          {hasFailed
            ? 'The weather service did not answer. We try again every few minutes, and this page fills by itself as soon as it does.'
            : 'This takes a few seconds. The page fills by itself.'}
        </p>
      </div>
      <SheetSkeleton />
    </>
  )
}
