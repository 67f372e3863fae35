import { postJson } from "./get-json";

/** Never cached: each look is asked for, and written down. */
export const lookAtSecret = (secretId: string) => postJson<{ code: string }>(`/api/secrets/${secretId}/look`, {});
