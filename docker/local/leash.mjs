// Loaded into each Node process that the launcher starts: when the launcher is gone, so is its end of this channel.
const leave = () => process.kill(process.pid, "SIGTERM");
process.on("disconnect", leave);
if (!process.connected) leave();
process.channel?.unref();
