// The outline of the nights ahead while they are read.
import { Skeleton } from '@/components/ui/skeleton'

export default function WeekLoading() {
  return (
    <Skeleton says="Reading the nights ahead">
      <div className="-mx-5 border-t border-rule bg-sheet lg:mx-0 lg:border-x">
        {Array.from({ length: 10 }, (_, index) => (
          <div key={index} className="h-[153px] border-b border-rule lg:h-[67px]" />
        ))}
      </div>
    </Skeleton>
  )
}
