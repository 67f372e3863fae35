import { parseArgs } from "node:util";
import { Faults } from "./faults.mjs";
import { httpServer } from "./http.mjs";
import { smtpServer } from "./smtp.mjs";
import { MailStore } from "./store.mjs";

const { values } = parseArgs({
  options: {
    smtp: { type: "string", default: "1025" },
    http: { type: "string", default: "8025" },
    dir: { type: "string", default: "./mail" },
    host: { type: "string", default: "127.0.0.1" },
  },
});

const store = await new MailStore(values.dir).load();
const faults = new Faults();
const smtp = smtpServer(store, faults);
const http = httpServer(store, faults);
await new Promise((resolve) => smtp.listen(Number(values.smtp), values.host, resolve));
await new Promise((resolve) => http.listen(Number(values.http), values.host, resolve));
console.log(`smtp://${values.host}:${smtp.server.address().port} http://${values.host}:${http.address().port}`);

for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => process.exit(0));
