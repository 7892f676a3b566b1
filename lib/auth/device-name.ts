// A browser and its system in words, from the header that it sends; the header itself is not kept.

/** In this order: browsers carry the names of those that they descend from. */
const BROWSERS: [mark: RegExp, name: string][] = [
  [/\bEdg(A|iOS)?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\bFirefox\/|\bFxiOS\//, 'Firefox'],
  [/\bCriOS\/|Chrom(e|ium)\//, 'Chrome'],
  [/\bVersion\/.*\bSafari\//, 'Safari'],
]

const SYSTEMS: [mark: RegExp, name: string][] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMac OS X\b|\bMacintosh\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
]

const nameIn = (names: [RegExp, string][], userAgent: string) => names.find(([mark]) => mark.test(userAgent))?.[1]

/** "Firefox on Android"; empty when nothing of it is known. */
export function deviceName(userAgent: string): string {
  const [browser, system] = [nameIn(BROWSERS, userAgent), nameIn(SYSTEMS, userAgent)]
  if (browser && system) return `${browser} on ${system}`
  return browser ?? system ?? ''
}
