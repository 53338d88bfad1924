import type { OpenAPIObject } from '@nestjs/swagger';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;

export type Method = (typeof METHODS)[number];
type Operation = NonNullable<OpenAPIObject['paths'][string]['get']>;

export interface DocumentedOperation {
  method: Method;
  path: string;
  operation: Operation;
}

export function operationsOf(document: OpenAPIObject): DocumentedOperation[] {
  return Object.entries(document.paths).flatMap(([path, item]) =>
    METHODS.flatMap((method) => {
      const operation = item[method];
      return operation ? [{ method, path, operation }] : [];
    }),
  );
}
