/** The part of s3rver that is used here; the package ships no types. */
declare module 's3rver' {
  import { type AddressInfo } from 'node:net';

  export default class S3rver {
    constructor(options: {
      address: string;
      port: number;
      silent: boolean;
      directory: string;
      configureBuckets: { name: string }[];
    });
    run(): Promise<AddressInfo>;
    close(): Promise<void>;
  }
}
