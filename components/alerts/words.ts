// Words of the alerts page: browsers by their push service, messages by their kind and fate.
import type { ToldMessage } from '@/lib/services/alert-preferences'

const BROWSERS: [hostEnd: string, name: string][] = [
  ['push.apple.com', 'Safari, or an app on an Apple home screen'],
  ['mozilla.com', 'Firefox'],
  ['notify.windows.com', 'Edge on Windows'],
  ['googleapis.com', 'Chrome or a browser of its kin'],
  ['jmt17.google.com', 'Chrome or a browser of its kin'],
]

export function browserName(pushHost: string): string {
  return BROWSERS.find(([hostEnd]) => pushHost.endsWith(hostEnd))?.[1] ?? `Browser with ${pushHost}`
}

export type AlertMessage = Pick<ToldMessage, 'kind' | 'channel' | 'state'>

const KINDS: Record<string, string> = {
  'flood-tonight': 'Good night to flood',
  'flood-changed': 'The hours changed',
  'flood-closed': 'No flood after all',
  'fill-ahead': 'A day to fill',
  'fill-changed': 'The day to fill changed',
  'fill-closed': 'No day to fill after all',
  'thaw-ahead': 'A thaw ahead',
  'fill-check': 'Look after the hose',
}

const STATES: Record<AlertMessage['state'], string> = {
  promised: 'on its way',
  delivered: 'sent',
  expired: 'dropped, too late to be of use',
  dead: 'could not be delivered',
}

export function kindText({ kind }: AlertMessage): string {
  return KINDS[kind] ?? 'Message'
}

export function fateText({ channel, state }: AlertMessage): string {
  return `${channel === 'email' ? 'E-mail' : 'Notification'}, ${STATES[state]}`
}
