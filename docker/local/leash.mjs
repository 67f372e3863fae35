// Loaded into each Node process that the launcher starts: when the launcher is gone, so is its end of this channel.
const leave = () => process.kill(process.pid, "SIGTERM");
process.on("disconnect", leave);
// A program run to its end has no such channel and needs none.
if (process.send && !process.connected) leave();
process.channel?.unref();
