// Preloaded by programs that `npm start` and `npm test` run: when those are killed outright, they end as if asked to.
const CHECK_MILLIS = 500
const PATIENCE_MILLIS = 25_000

const parent = Number(process.env.NIGHTSHEET_PARENT)
// Processes that this one forks preload this file too; they have another parent and are not meant.
delete process.env.NIGHTSHEET_PARENT

if (parent > 0) {
  const timer = setInterval(() => {
    if (process.ppid === parent) return
    clearInterval(timer)
    setTimeout(() => process.kill(process.pid, 'SIGKILL'), PATIENCE_MILLIS).unref()
    process.kill(process.pid, 'SIGTERM')
  }, CHECK_MILLIS)
  // Watching alone is no reason to go on living.
  timer.unref()
}
