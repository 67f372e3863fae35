// Loaded into each Node process that the launcher starts: when the launcher is gone, so is its end of this channel.
// Processes which those start inherit this file, not the duty.
if (process.ppid === Number(process.env.LAUNCHER_PID)) {
  process.on("disconnect", () => process.kill(process.pid, "SIGTERM"));
  process.channel?.unref();
} else if (process.connected === false) {
  process.kill(process.pid, "SIGTERM");
}
