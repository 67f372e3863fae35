import { currentBuild } from "./build.mjs";
import { builtPrograms } from "./programs.mjs";
import { serve } from "./serve.mjs";

await serve({ command: "npm start", purpose: "start", programs: async () => builtPrograms(await currentBuild()) });
