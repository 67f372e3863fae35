/** Signs in through the form on the page as a browser without scripts does; answers the session's cookies. */
export async function cookiesOf(address: string, email: string, password: string): Promise<string> {
  const page = await (await fetch(`${address}/sign-in`)).text();
  const form = page.match(/<form[^>]*>.*?<\/form>/s)?.[0] ?? "";
  const data = new FormData();
  for (const [input] of form.matchAll(/<input[^>]*type="hidden"[^>]*>/g)) {
    const part = (name: string) =>
      input.match(new RegExp(`\\s${name}="([^"]*)"`))?.[1]?.replaceAll("&quot;", '"') ?? "";
    data.append(part("name"), part("value"));
  }
  data.append("email", email);
  data.append("password", password);
  const answer = await fetch(`${address}/sign-in`, { method: "POST", body: data, redirect: "manual" });
  const cookies = answer.headers.getSetCookie().map((cookie) => cookie.split(";")[0]);
  if (!cookies.some((cookie) => cookie?.includes("session-token"))) {
    throw new Error(`${email} was not let in (${answer.status})`);
  }
  return cookies.join("; ");
}
