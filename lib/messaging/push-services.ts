// The push services of the browsers. A subscription comes from outside; our server calls no other address for it.

/** Exact hosts. Chrome and its kin; Firefox. The second is named in Chromium's source for its test builds. */
const HOSTS = ['fcm.googleapis.com', 'jmt17.google.com', 'updates.push.services.mozilla.com']

/** Any host below these. Safari (Apple tells servers to allow the whole domain); Edge on Windows (WNS, likewise). */
const PARENT_DOMAINS = ['push.apple.com', 'notify.windows.com']

/**
 * Whether the endpoint of a subscription may be called: https, no port or credentials of its own, a known host;
 * or one of the configured origins, which must match whole.
 */
export function isAllowedPushEndpoint(endpoint: string, extraOrigins: readonly string[]): boolean {
  if (!URL.canParse(endpoint)) return false
  const url = new URL(endpoint)
  if (url.protocol !== 'https:' || url.username || url.password) return false
  if (isExtraPushOrigin(endpoint, extraOrigins)) return true
  if (url.port) return false
  return HOSTS.includes(url.hostname) || PARENT_DOMAINS.some((domain) => url.hostname.endsWith(`.${domain}`))
}

/** Whether the endpoint lies on an origin that the settings add: the only ones for which a private CA counts. */
export function isExtraPushOrigin(endpoint: string, extraOrigins: readonly string[]): boolean {
  return extraOrigins.some((origin) => URL.canParse(origin) && new URL(origin).origin === new URL(endpoint).origin)
}
