/** The database cannot be opened; the message is one sentence for the person who starts the product. */
export class DatabaseFailure extends Error {
  override readonly name: string = 'DatabaseFailure';
}

/** Another process has the data folder open; opening it twice would lose rows without a word. */
export class DataFolderInUse extends DatabaseFailure {
  override readonly name = 'DataFolderInUse';

  constructor(
    readonly folder: string,
    readonly holderPid: number,
  ) {
    super(
      `the data folder ${folder} is in use by process ${holderPid}. Stop that one first, or name another folder in LIGAMENT_DATA_DIR.`,
    );
  }
}

/** A statement overran its deadline or the database worker ended; nothing of that transaction was kept. */
export class DatabaseUnavailable extends Error {
  override readonly name = 'DatabaseUnavailable';
}

/** Too little disk is left to write safely. */
export class StorageFull extends Error {
  override readonly name = 'StorageFull';
}
