/** One entry of `static/examples/index.json`. */
export interface Example {
  readonly file: string;
  readonly title: string;
  /** One line: what the plan shows. */
  readonly about: string;
}
