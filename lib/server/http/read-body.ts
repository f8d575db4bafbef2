import 'server-only';
import { ApiError } from './api-error';

/** The JSON in the body, at most `limit` bytes of it; anything but `application/json` is refused. */
export async function readJsonBody(request: Request, limit: number): Promise<unknown> {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (type !== 'application/json') {
    throw new ApiError('wrong-content-type', 'The body must be JSON, sent as application/json.');
  }
  const text = await readText(request, limit);
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new ApiError('bad-request', 'The body is not JSON.');
  }
  refuseUnstorable(value, text);
  return value;
}

async function readText(request: Request, limit: number): Promise<string> {
  const tooLarge = () => new ApiError('too-large', `The body may have at most ${limit} bytes.`);
  if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of request.body ?? []) {
    size += chunk.byteLength;
    if (size > limit) throw tooLarge();
    chunks.push(chunk);
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks));
  } catch {
    throw new ApiError('bad-request', 'The body is not UTF-8.');
  }
}

/** PostgreSQL stores neither U+0000 nor half a surrogate pair; both reach a string only through an escape. */
function refuseUnstorable(value: unknown, text: string): void {
  if (!/\\u(?:0000|d[89a-f])/i.test(text)) return;
  const path = unstorablePath(value, '');
  if (path === null) return;
  const message = 'holds a character that cannot be stored (U+0000 or half of a pair).';
  throw new ApiError('invalid', `${path || '$'} ${message}`, { problems: [{ path: path || '$', message }] });
}

function unstorablePath(value: unknown, path: string): string | null {
  if (typeof value === 'string') return value.includes('\0') || !isWellFormed(value) ? path : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, item] of Object.entries(value)) {
    if (unstorablePath(key, '') !== null) return path;
    const at = Array.isArray(value) ? `${path}[${key}]` : path ? `${path}.${key}` : key;
    const found = unstorablePath(item, at);
    if (found !== null) return found;
  }
  return null;
}

function isWellFormed(text: string): boolean {
  return !/\p{Surrogate}/u.test(text);
}
