declare module 's3rver' {
  /** The part of it that is used here; the package ships no types. */
  export default class S3rver {
    constructor(options: { port: number; address: string; silent: boolean; directory: string; configureBuckets: { name: string; configs: never[] }[] });
    run(): Promise<unknown>;
    close(): Promise<void>;
  }
}
