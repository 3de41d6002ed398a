/** The little of the load generator that the bench uses; the package brings no types. */
declare module 'autocannon' {
  interface Options {
    url: string;
    connections: number;
    duration: number;
    headers: Record<string, string>;
  }
  interface Result {
    duration: number;
    '2xx': number;
    non2xx: number;
    errors: number;
    timeouts: number;
  }
  interface Run extends PromiseLike<Result> {
    on(
      event: 'response',
      heard: (client: unknown, status: number, bytes: number, ms: number) => void,
    ): this;
  }
  export default function autocannon(options: Options): Run;
}
