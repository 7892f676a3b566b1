// The outline of the Freezing page while it is reckoned.
import { Skeleton, SkeletonColumns } from '@/components/ui/skeleton'

export default function FreezingLoading() {
  return (
    <Skeleton says="Reckoning the ice">
      <div className="h-[260px] border-y border-rule bg-sheet" />
      <SkeletonColumns look="h-[240px]" />
    </Skeleton>
  )
}
