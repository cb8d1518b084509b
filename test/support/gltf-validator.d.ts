declare module 'gltf-validator' {
  /** What the validator found; severity 0 is an error, 1 a warning, 2 information, 3 a hint. */
  export interface Report {
    readonly issues: {
      readonly numErrors: number;
      readonly numWarnings: number;
      readonly messages: readonly {
        readonly code: string;
        readonly severity: number;
        readonly pointer?: string;
      }[];
    };
  }

  export function validateString(json: string): Promise<Report>;
}
