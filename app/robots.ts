// Search engines may read what needs no account, nothing else.
import type { MetadataRoute } from 'next'

export default function robots(): MetadataRoute.Robots {
  return { rules: { userAgent: '*', allow: ['/$', '/how-it-works'], disallow: '/' } }
}
