import { sourcePrograms } from "./programs.mjs";
import { serve } from "./serve.mjs";

await serve({ command: "npm run dev", purpose: "dev", programs: sourcePrograms, show: true });
