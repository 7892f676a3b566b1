// The outline of the building plan while it is read.
import { Skeleton, SkeletonColumns } from '@/components/ui/skeleton'

export default function PlanLoading() {
  return (
    <Skeleton says="Reading the plan" hasLine={false}>
      <div className="-mx-5 h-[300px] border-y border-rule bg-sheet lg:mx-0 lg:h-[390px] lg:border-x" />
      <SkeletonColumns look="h-[560px]" />
    </Skeleton>
  )
}
