/**
 * Loaded before the server (`node --import`): when the start script is gone, even by kill -9, the channel to it
 * closes, and the server ends in its usual way, or after a second without it.
 */
if (process.channel) {
  process.on('disconnect', () => {
    process.kill(process.pid, 'SIGTERM')
    setTimeout(() => process.exit(1), 1000).unref()
  })
  process.channel.unref()
}
