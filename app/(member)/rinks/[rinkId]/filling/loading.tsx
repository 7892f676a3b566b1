// The outline of the Filling page while it is read.
import { Skeleton, SkeletonColumns } from '@/components/ui/skeleton'

export default function FillingLoading() {
  return (
    <Skeleton says="Reading how the fill stands">
      <div className="h-[72px] border-y border-rule bg-sheet" />
      <SkeletonColumns look="h-[320px]" />
    </Skeleton>
  )
}
