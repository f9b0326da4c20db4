/**
 * Single-precision numbers out of a packed column. A driver's buffer need not be aligned, so it is copied.
 */
export function floatsOf(packed: Buffer): Float32Array {
  const { buffer, byteOffset, byteLength } = packed;
  return new Float32Array(buffer.slice(byteOffset, byteOffset + byteLength) as ArrayBuffer);
}

/** The bytes of a typed array, without a copy. */
export function bytesOf(values: ArrayBufferView): Buffer {
  return Buffer.from(values.buffer, values.byteOffset, values.byteLength);
}
