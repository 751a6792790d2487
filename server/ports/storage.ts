/** Keeps files by name. `put` resolves when the file is durable; `get` answers null for what is not there. */
export interface Storage {
  put: (name: string, bytes: Buffer) => Promise<void>;
  get: (name: string) => Promise<Buffer | null>;
}
