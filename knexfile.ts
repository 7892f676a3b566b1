// Knex's own command line reads this: `node --import tsx node_modules/knex/bin/cli.js migrate:make …`.
import { knexConfig } from './db/knex'

export default knexConfig(process.env.DATABASE_URL ?? '')
