/** JSON Patch, RFC 6902: the operations this project writes. */
export type JsonPatchOperation =
  | { readonly op: 'add' | 'replace'; readonly path: string; readonly value: unknown }
  | { readonly op: 'remove'; readonly path: string };

export type JsonPatch = JsonPatchOperation[];
