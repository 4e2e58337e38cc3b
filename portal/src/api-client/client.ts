import createClient from 'openapi-fetch';
import { noConnection, problemFrom } from './problem-error';
import { refreshOnce } from './refresh';
import type { paths } from './schema';

const OWN_ANSWERS = ['/api/auth/sign-in', '/api/auth/sign-out', '/api/auth/refresh'];

async function send(request: Request): Promise<Response> {
  try {
    return await globalThis.fetch(request);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw noConnection();
  }
}

/** One request; when the sign-in has run out it is renewed and the request sent once more. */
async function fetchSignedIn(request: Request): Promise<Response> {
  const again = request.clone();
  const sentAt = Date.now();
  const answer = await send(request);
  if (answer.status !== 401 || OWN_ANSWERS.includes(new URL(request.url).pathname)) return answer;
  return (await refreshOnce(sentAt)) ? send(again) : answer;
}

/** The API, typed by its own OpenAPI document. Always read the answer through `unwrap`. */
export const api = createClient<paths>({ baseUrl: globalThis.location.origin, fetch: fetchSignedIn });

/**
 * The body of a successful answer.
 * @throws ProblemError for every other answer, and with status 0 when there was none.
 * @example const me = await unwrap(api.GET('/api/auth/me'));
 */
export async function unwrap<T>(
  call: Promise<{ data?: T; error?: unknown; response: Response }>,
): Promise<T> {
  const { data, error, response } = await call;
  if (!response.ok) throw problemFrom(response.status, error);
  return data as T;
}
