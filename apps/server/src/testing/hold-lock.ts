import { lockDataFolder } from '../data-folder-lock.ts'

/** Locks the folder of its argument until it is killed; tests start it as a second process. */
try {
  await lockDataFolder(process.argv[2] ?? '')
  console.log('held')
  setInterval(() => undefined, 60_000)
} catch (error) {
  console.log(error instanceof Error ? error.message : 'unknown')
}
