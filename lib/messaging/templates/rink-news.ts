// What messages about a rink share: a name that fits a subject, a text that fits a notification, and the ways out.
import { cutPolitely, oneLine } from './plain'

const LONGEST_NAME = 60
const LONGEST_BODY = 180

/** The name of a rink or a person, as somebody typed it. */
export function shortName(name: string): string {
  return cutPolitely(oneLine(name), LONGEST_NAME)
}

/** Sentences of a notification; empty ones are left out. */
export function pushBody(...sentences: string[]): string {
  return cutPolitely(oneLine(sentences.join(' ')), LONGEST_BODY)
}

export interface WaysOut {
  unsubscribeUrl: string
  manageUrl: string
}

export function waysOut({ unsubscribeUrl, manageUrl }: WaysOut): { label: string; url: string }[] {
  return [
    { label: 'Stop these mails', url: unsubscribeUrl },
    { label: 'Choose how and when you are told', url: manageUrl },
  ]
}
