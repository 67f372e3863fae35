/** A read from one of our own routes; a refusal comes as an error in its own words. */
export async function getJson<T>(url: string, signal: AbortSignal): Promise<T> {
  const response = await fetch(url, { signal });
  const body = await response.json();
  if (!response.ok) throw new Error(typeof body?.title === "string" ? body.title : "The answer could not be read");
  return body as T;
}
