/** Fetches an address as a signed-in person and reads the whole answer. */
export async function fetchBody(url: string, cookie: string): Promise<string> {
  const response = await fetch(url, { headers: { cookie } });
  const body = await response.text();
  if (!response.ok) throw new Error(`${url} answered ${response.status}: ${body.slice(0, 200)}`);
  return body;
}
