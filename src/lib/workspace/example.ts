/** One entry of `static/examples/index.json`. */
export interface Example {
  readonly file: string;
  readonly title: string;
  /** One line: what the plan shows. */
  readonly about: string;
}

/** An example as it is offered: with its verdict and its level curve. */
export interface ExampleCard extends Example {
  readonly holds: boolean;
  /** dB at the seat, 10–200 Hz in even steps of log f. */
  readonly levels: readonly number[];
}
