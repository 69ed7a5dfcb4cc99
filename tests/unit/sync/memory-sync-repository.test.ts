import { createMemorySyncRepository } from '../../support/memory-sync-repository'
import { describeSyncRepository } from '../../support/sync-repository-contract'

// The simulation stands on this stand-in: it must keep every promise that MariaDB keeps.
describeSyncRepository('memory', async () => ({ repository: createMemorySyncRepository(), dispose: async () => undefined }))
