import type { BenchContext } from './bench';

export type DemoRole = 'technologist' | 'physicist' | 'interventionalist' | 'committee' | 'administrator';

/** Signs a demo account in and returns the Cookie header for its further requests. */
export async function signIn(
  { url, demoPassword }: Pick<BenchContext, 'url' | 'demoPassword'>,
  role: DemoRole,
): Promise<string> {
  const response = await fetch(`${url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: `${role}@marrowcreek.example`, password: demoPassword }),
  });
  if (!response.ok) throw new Error(`${role} could not sign in: ${response.status}`);
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}
