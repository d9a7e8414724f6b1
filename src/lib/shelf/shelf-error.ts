/** What can go wrong with the shelf, each with a sentence for the user. */
export class ShelfError extends Error {
  override readonly name: string = 'ShelfError';
}

/** The browser gives no more room. What was to be stored is still in the caller's hands: it can be exported. */
export class ShelfFull extends ShelfError {
  override readonly name = 'ShelfFull';
  constructor(options?: ErrorOptions) {
    super('There is no room left on this device. Export the plan to a file, or remove plans.', options);
  }
}

/** The store was closed under the page: by a newer Sealwright in another tab, or by the browser. */
export class ShelfClosed extends ShelfError {
  override readonly name = 'ShelfClosed';
  constructor(options?: ErrorOptions) {
    super('The shelf was closed by another tab or the browser. Export the plan, then reload.', options);
  }
}

export class NotOnShelf extends ShelfError {
  override readonly name = 'NotOnShelf';
  constructor(readonly id: string) {
    super('This plan is not on the shelf of this device.');
  }
}

/** The plan is kept, but this Sealwright cannot read it. */
export class UnreadablePlan extends ShelfError {
  override readonly name = 'UnreadablePlan';
  constructor(
    readonly id: string,
    trouble: string
  ) {
    super(trouble);
  }
}

/** Another tab has stored the plan since: nothing was overwritten. */
export class ChangedElsewhere extends ShelfError {
  override readonly name = 'ChangedElsewhere';
  constructor(readonly id: string) {
    super('This plan was changed in another tab.');
  }
}
