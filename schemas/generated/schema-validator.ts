/** One fault that a schema finds. @see https://ajv.js.org/api.html#error-objects */
export interface SchemaFault {
  readonly keyword: string;
  /** JSON Pointer into the value. */
  readonly instancePath: string;
  readonly schemaPath: string;
  readonly params: Readonly<Record<string, unknown>>;
  readonly message?: string;
}

/** A validator made from a schema: true where the value matches, else its `errors` hold every fault. */
export interface SchemaValidator<T> {
  (value: unknown): value is T;
  errors?: readonly SchemaFault[] | null;
}
