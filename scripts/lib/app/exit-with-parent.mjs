/**
 * Loaded into the built server before it starts. The channel to the script that started it closes when that script
 * ends in any way, even killed outright; then the server must not stay behind holding the port.
 */
process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'))
// Listening alone must not keep a server alive that has finished.
process.channel?.unref()
