import 'server-only';
import type { z } from 'zod';
import type { Action } from '@/lib/access/can';
import type { OperationEnvelope } from '@/lib/schemas/operation';
import type { WriteContext, Written } from './context';

/** One kind and version of write: who may do it, what its body holds, and the service that does it. */
export type OperationHandler = {
  kind: string;
  version: number;
  action: Action;
  body: z.ZodType;
  run: (context: WriteContext, body: unknown) => Promise<Written>;
  /** What the answer carries besides, worked out anew each time and never stored, such as a one-time link. */
  reveal?: (operation: OperationEnvelope) => Record<string, unknown>;
};

export function defineOperation<Body extends z.ZodType>(definition: {
  kind: string;
  version: number;
  action: Action;
  body: Body;
  service: (context: WriteContext, body: z.output<Body>) => Promise<Written>;
  reveal?: (operation: OperationEnvelope) => Record<string, unknown>;
}): OperationHandler {
  const { service, ...rest } = definition;
  // The body has been parsed by this very schema before run is called.
  return { ...rest, run: (context, body) => service(context, body as z.output<Body>) };
}
