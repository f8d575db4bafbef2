import 'server-only';
import { Zip, ZipDeflate } from 'fflate';

const SLICE = 64 * 1024;

/** `bytes` in slices, without copying them. */
export function* byteSlices(bytes: Uint8Array): Generator<Uint8Array<ArrayBuffer>> {
  for (let at = 0; at < bytes.byteLength; at += SLICE) {
    yield bytes.subarray(at, at + SLICE) as Uint8Array<ArrayBuffer>;
  }
}

/** A zip archive of `files` in parts, each packed when it is asked for. The same files give the same bytes. */
export function* archiveParts(
  files: readonly { readonly file: string; readonly bytes: Uint8Array }[],
): Generator<Uint8Array<ArrayBuffer>> {
  const ready: Uint8Array<ArrayBuffer>[] = [];
  const zip = new Zip((error, part) => {
    if (error) throw error;
    ready.push(part as Uint8Array<ArrayBuffer>);
  });
  for (const { file, bytes } of files) {
    const entry = new ZipDeflate(file, { level: 6 });
    entry.mtime = new Date(1980, 0, 1); // the earliest that a zip can hold: no clock in what is downloaded
    zip.add(entry);
    for (let at = 0; at < bytes.byteLength || at === 0; at += SLICE) {
      entry.push(bytes.subarray(at, at + SLICE), at + SLICE >= bytes.byteLength);
      yield* ready.splice(0);
    }
  }
  zip.end();
  yield* ready.splice(0);
}

/** A file to be saved, sent part by part as the receiver takes it. */
export function downloadResponse(
  parts: Iterator<Uint8Array<ArrayBuffer>>,
  { file, mediaType, length }: { file: string; mediaType: string; length?: number },
): Response {
  const stream = new ReadableStream<Uint8Array<ArrayBuffer>>({
    pull(controller) {
      const next = parts.next();
      if (next.done) controller.close();
      else controller.enqueue(next.value);
    },
    cancel: () => void parts.return?.(),
  });
  return new Response(stream, {
    headers: {
      'content-type': mediaType,
      // File names are plain by construction, so they need no escaping here.
      'content-disposition': `attachment; filename="${file}"`,
      'cache-control': 'private, no-cache',
      'x-content-type-options': 'nosniff',
      ...(length === undefined ? {} : { 'content-length': String(length) }),
    },
  });
}
