// Loaded into each Node process that the launcher starts: when the launcher is gone, so is its end of this channel.
process.on("disconnect", () => process.kill(process.pid, "SIGTERM"));
process.channel?.unref();
