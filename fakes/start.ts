// Starts every fake for `npm start` and the end-to-end tests, and stops them all on SIGTERM.
import { z } from 'zod'
import { startMailFake } from './mail/server'
import { startPushFake } from './push/server'
import { startWeatherFake } from './weather/server'

const port = z.coerce.number().int().min(0).max(65_535)

const settings = z
  .object({
    FAKE_WEATHER_PORT: port,
    FAKE_SMTP_PORT: port,
    FAKE_MAIL_PORT: port,
    FAKE_PUSH_PORT: port,
    FAKE_PUSH_PAGE_PORT: port,
    FAKE_CA_FILE: z.string().min(1),
  })
  .parse(process.env)

const fakes = await Promise.all([
  startWeatherFake({ port: settings.FAKE_WEATHER_PORT }),
  startMailFake({ smtpPort: settings.FAKE_SMTP_PORT, pagePort: settings.FAKE_MAIL_PORT }),
  startPushFake({
    port: settings.FAKE_PUSH_PORT,
    pagePort: settings.FAKE_PUSH_PAGE_PORT,
    caFile: settings.FAKE_CA_FILE,
  }),
])

const stopAll = () => void Promise.all(fakes.map((fake) => fake.close())).then(() => process.exit(0))
process.once('SIGTERM', stopAll)
process.once('SIGINT', stopAll)

process.stdout.write('fakes ready\n')
