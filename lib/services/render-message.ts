// Turns a promised message into the mail or push that goes out.
import { formatInTimeZone } from 'date-fns-tz'
import type { FillDayKind } from '@/lib/advice/fill-day-due'
import { LINK_LIFETIME_SECONDS, linkUrl } from '@/lib/auth/account-links'
import type { MessageToDeliver } from '@/db/queries/deliveries'
import type { EmailMessage, PushMessage } from '@/lib/messaging/port'
import {
  addressAlreadyRegisteredMail,
  addressChangedMail,
  changeAddressMail,
  deletionAskedMail,
  resetPasswordMail,
  signInLinkMail,
  testMail,
  verifyAddressMail,
} from '@/lib/messaging/templates/account'
import { alertMail, alertPush, type AlertKind, type AlertWords } from '@/lib/messaging/templates/alerts'
import { fillCheckMail, fillCheckPush, type FillCheckWords } from '@/lib/messaging/templates/fill-check'
import { fillDayMail, fillDayPush, type FillDayWords } from '@/lib/messaging/templates/fill-day'
import { invitationMail, type InvitationWords } from '@/lib/messaging/templates/invitation'
import type { MailWords } from '@/lib/messaging/templates/letter'
import {
  alertContentSchema,
  fillCheckContentSchema,
  fillDayContentSchema,
  invitationContentSchema,
  linkContentSchema,
  deletionContentSchema,
} from '@/lib/schemas/alert-content'
import { AS_ROLE, ROLE_CAN } from '@/lib/words/roles'
import { INVITATION_DAYS } from './invitations'
import { unsubscribeUrl } from './unsubscribe'

export interface RenderSettings {
  publicUrl: string
  secret: string
}

const LINK_MAILS = {
  'verify-address': { purpose: 'verify', write: verifyAddressMail },
  'sign-in-link': { purpose: 'sign-in', write: signInLinkMail },
  'reset-password': { purpose: 'reset', write: resetPasswordMail },
  'change-address': { purpose: 'change-email', write: changeAddressMail },
} as const

function isAlert(kind: MessageToDeliver['kind']): kind is AlertKind {
  return kind === 'thaw-ahead' || kind.startsWith('flood-')
}

function alertWords(message: MessageToDeliver, { publicUrl, secret }: RenderSettings): AlertWords {
  const { rinkId, words } = alertContentSchema.parse(message.content)
  return {
    ...words,
    tonightUrl: `${publicUrl}/rinks/${rinkId}`,
    manageUrl: `${publicUrl}/rinks/${rinkId}/alerts`,
    unsubscribeUrl: unsubscribeUrl(publicUrl, secret, { userId: message.userId, rinkId }),
  }
}

function fillCheckWords(message: MessageToDeliver, { publicUrl, secret }: RenderSettings): FillCheckWords {
  const { rinkId, words } = fillCheckContentSchema.parse(message.content)
  return {
    ...words,
    fillingUrl: `${publicUrl}/rinks/${rinkId}/filling`,
    manageUrl: `${publicUrl}/rinks/${rinkId}/alerts`,
    unsubscribeUrl: unsubscribeUrl(publicUrl, secret, { userId: message.userId, rinkId }),
  }
}

function isFillDay(kind: MessageToDeliver['kind']): kind is FillDayKind {
  return kind !== 'fill-check' && kind.startsWith('fill-')
}

function fillDayWords(message: MessageToDeliver, { publicUrl, secret }: RenderSettings): FillDayWords {
  const { rinkId, words } = fillDayContentSchema.parse(message.content)
  return {
    ...words,
    weekUrl: `${publicUrl}/rinks/${rinkId}/week`,
    manageUrl: `${publicUrl}/rinks/${rinkId}/alerts`,
    unsubscribeUrl: unsubscribeUrl(publicUrl, secret, { userId: message.userId, rinkId }),
  }
}

function invitationWords(message: MessageToDeliver, { publicUrl, secret }: RenderSettings): InvitationWords {
  const { invitationId, words } = invitationContentSchema.parse(message.content)
  return {
    ...words,
    asRole: AS_ROLE[words.role],
    can: ROLE_CAN[words.role],
    validFor: `${INVITATION_DAYS} days`,
    url: linkUrl(publicUrl, secret, { id: invitationId, purpose: 'invitation' }),
  }
}

function accountMail(message: MessageToDeliver, { publicUrl, secret }: RenderSettings): MailWords {
  if (message.kind === 'address-already-registered') {
    return addressAlreadyRegisteredMail({ signInUrl: `${publicUrl}/sign-in`, resetUrl: `${publicUrl}/reset` })
  }
  if (message.kind === 'address-changed') return addressChangedMail({ signInUrl: `${publicUrl}/sign-in` })
  if (message.kind === 'rink-invitation') return invitationMail(invitationWords(message, { publicUrl, secret }))
  if (message.kind === 'test') return testMail({ accountUrl: `${publicUrl}/account` })
  if (message.kind === 'deletion-asked') {
    const { dueAt } = deletionContentSchema.parse(message.content)
    return deletionAskedMail({ on: formatInTimeZone(dueAt, 'UTC', 'd MMMM yyyy'), signInUrl: `${publicUrl}/sign-in` })
  }
  if (isAlert(message.kind) || isFillDay(message.kind) || message.kind === 'fill-check')
    throw new Error(`${message.kind} is no account mail`)
  const { purpose, write } = LINK_MAILS[message.kind]
  const { linkId } = linkContentSchema.parse(message.content)
  return write({
    url: linkUrl(publicUrl, secret, { id: linkId, purpose }),
    validFor: lifetime(LINK_LIFETIME_SECONDS[purpose]),
  })
}

function lifetime(seconds: number): string {
  return seconds >= 7200 ? `${seconds / 3600} hours` : `${seconds / 60} minutes`
}

/** The mail, with the same Message-ID at every try. */
export function renderEmail(message: MessageToDeliver, settings: RenderSettings): EmailMessage {
  const messageId = `<${message.id}@${new URL(settings.publicUrl).hostname}>`
  if (message.kind === 'fill-check') {
    const words = fillCheckWords(message, settings)
    return { to: message.email, messageId, ...fillCheckMail(words), unsubscribeUrl: words.unsubscribeUrl }
  }
  if (isFillDay(message.kind)) {
    const words = fillDayWords(message, settings)
    return { to: message.email, messageId, ...fillDayMail(message.kind, words), unsubscribeUrl: words.unsubscribeUrl }
  }
  if (!isAlert(message.kind)) return { to: message.email, messageId, ...accountMail(message, settings) }
  const words = alertWords(message, settings)
  return { to: message.email, messageId, ...alertMail(message.kind, words), unsubscribeUrl: words.unsubscribeUrl }
}

/** What the service worker shows; one tag per rink and night, so that newer news replaces older. */
export function renderPush(message: MessageToDeliver, settings: RenderSettings): PushMessage['payload'] {
  if (message.kind === 'fill-check') return fillCheckPush(fillCheckWords(message, settings), `fill:${message.rinkId}`)
  if (isFillDay(message.kind)) {
    return fillDayPush(message.kind, fillDayWords(message, settings), `fill-day:${message.rinkId}`)
  }
  if (message.kind === 'test') {
    const body = 'Word of a good night will come the same way.'
    return { title: 'This device is told', body, url: `${settings.publicUrl}/account`, tag: `test:${message.id}` }
  }
  if (!isAlert(message.kind)) throw new Error(`${message.kind} is not sent by push`)
  const { rinkId, nightDate } = alertContentSchema.parse(message.content)
  const tag = message.kind === 'thaw-ahead' ? `thaw:${rinkId}` : `night:${rinkId}:${nightDate}`
  return alertPush(message.kind, alertWords(message, settings), tag)
}
