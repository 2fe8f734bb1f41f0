import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle'
import type { Adapter } from 'lucia'
import type { Db } from '../../db/client'
import { person } from '../../db/schema/person'
import { session } from '../../db/schema/session'

/** What Lucia reads and writes sessions through. */
export const sessionAdapter = (db: Db): Adapter => new DrizzleSQLiteAdapter(db, session, person)
