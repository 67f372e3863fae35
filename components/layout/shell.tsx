export { OfficeShell as Shell } from "./office-shell";
