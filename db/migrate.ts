import { join } from "node:path";
import { ownerUrl } from "@/lib/env";
import { migrateDatabase } from "./migrations";

const count = await migrateDatabase(ownerUrl(), join(process.cwd(), "db/migrations"));
console.log(`Database is at migration ${count}`);
