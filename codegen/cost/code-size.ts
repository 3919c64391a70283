import { minify } from 'terser';

/** Size of an emitted file in bytes, as it is and minified. */
export async function codeSize(code: string): Promise<{ bytes: number; minified_bytes: number }> {
  const { code: small } = await minify(code, { module: true, ecma: 2015 });
  return { bytes: Buffer.byteLength(code), minified_bytes: Buffer.byteLength(small ?? '') };
}
