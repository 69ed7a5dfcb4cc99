import { mariadbSyncRepository } from '#server/repositories/sync'
import { openTestDatabase } from '../support/opened-database'
import { describeSyncRepository } from '../support/sync-repository-contract'

describeSyncRepository('MariaDB', async () => {
  const opened = await openTestDatabase()
  return { repository: mariadbSyncRepository, dispose: opened.close }
})
