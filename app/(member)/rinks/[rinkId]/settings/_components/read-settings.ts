// What every settings page reads: the rink, and how its keeper reads figures.
import 'server-only'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { getRinkSettings, type RinkSettings } from '@/lib/services/rink-settings'
import { wordsFor, type WordOptions } from '@/lib/words/options'

export async function readSettings(rinkId: string): Promise<{ rink: RinkSettings; words: WordOptions }> {
  const context = await pageContext()
  const rink = await orNotFound(getRinkSettings(context, rinkId))
  return { rink, words: wordsFor(await orNotFound(getAccount(context)), rink.timeZone) }
}
