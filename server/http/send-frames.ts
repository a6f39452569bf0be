import { encodeFrames, type Frames } from '@shared/traces/frames';
import type { Request, Response } from 'express';

/** Whether the caller asks for traces in binary. */
export function wantsFrames(request: Request): boolean {
  return request.accepts('json', 'application/octet-stream') === 'application/octet-stream';
}

/** Answers traces in binary; NOTE: never compressed, levels hardly shrink and it would cost a hundred times their reading. */
export function sendFrames<Meta>(response: Response, frames: Frames<Meta>): void {
  const { buffer, byteOffset, byteLength } = encodeFrames(frames);
  response.type('application/octet-stream').send(Buffer.from(buffer, byteOffset, byteLength));
}
