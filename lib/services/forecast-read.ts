// The forecast an outlook was judged from, as screens name it.
import { findForecastHead } from '@/db/queries/forecasts'
import type { ServiceContext } from '@/lib/context'
import type { TonightView } from '@/lib/schemas/tonight-view'

export async function forecastRead(
  { db, now }: Pick<ServiceContext, 'db' | 'now'>,
  forecastId: string,
): Promise<TonightView['forecast']> {
  const forecast = await findForecastHead(db, forecastId)
  if (!forecast) return null
  return {
    provider: forecast.provider,
    issuedAt: forecast.issuedAt?.toISOString() ?? null,
    fetchedAt: forecast.fetchedAt.toISOString(),
    isStale: now >= forecast.expiresAt,
    attribution: forecast.attribution,
  }
}
