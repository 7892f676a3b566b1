// Preloaded by children of `npm start` and `npm test`: when the parent is killed outright, they end as if asked to.
const PATIENCE_MILLIS = 25_000

if (process.channel) {
  process.once('disconnect', () => {
    setTimeout(() => process.kill(process.pid, 'SIGKILL'), PATIENCE_MILLIS).unref()
    process.kill(process.pid, 'SIGTERM')
  })
  // The channel alone is no reason to go on living.
  process.channel.unref()
}
