/** The ETag of a thing's version, as the server gives it out and wants it back in If-Match. */
export const etagOf = (version: number): string => `"v${version}"`;

/** The version behind an ETag; `null` when it is none of ours. A proxy that compresses marks it as weak. */
export function versionOf(etag: string): number | null {
  const digits = /^(?:W\/)?"v(\d{1,15})"$/.exec(etag.trim())?.[1];
  return digits === undefined ? null : Number(digits);
}
