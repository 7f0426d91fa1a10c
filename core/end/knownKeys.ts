import { endSchema } from './schema.ts';

interface Definition {
  readonly type: string;
  readonly shape?: Readonly<Record<string, Node>>;
  readonly innerType?: Node;
  readonly options?: readonly Node[];
}
interface Node {
  readonly def: Definition;
}

const objectsIn = ({ def }: Node): Readonly<Record<string, Node>>[] => {
  if (def.shape) return [def.shape];
  if (def.innerType) return objectsIn(def.innerType);
  return (def.options ?? []).flatMap(objectsIn);
};

/** Names of the fields that the schema knows at a place of the end. */
export const knownKeys = (path: readonly PropertyKey[]): string[] => {
  let objects = objectsIn(endSchema as unknown as Node);
  for (const key of path) {
    objects = objects.flatMap((shape) => {
      const next = shape[String(key)];
      return next ? objectsIn(next) : [];
    });
  }
  return [...new Set(objects.flatMap((shape) => Object.keys(shape)))];
};
