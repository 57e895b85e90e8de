import { DatabaseUnavailable } from './database-failures';
import type { QueryResult } from './worker-messages';

interface QueryOptions {
  readonly rowMode?: 'array' | 'object';
}

/** What a query builder needs of a connection. */
export interface QueryClient {
  query(sql: string, params?: readonly unknown[], options?: QueryOptions): Promise<QueryResult>;
}

/**
 * The work of one transaction with the connection it holds. Gives up when the work leaves the connection idle for too
 * long, and refuses statements that come after the end: alone, they would be kept outside any transaction.
 */
export class BoundTransaction implements QueryClient {
  private open = true;
  private idle: NodeJS.Timeout | undefined;
  private expire: () => void = () => undefined;

  constructor(
    private readonly connection: QueryClient,
    private readonly idleDeadlineMs: number,
  ) {}

  get isOpen(): boolean {
    return this.open;
  }

  async run<T>(work: (client: QueryClient) => Promise<T>): Promise<T> {
    const expired = new Promise<never>((_, reject) => {
      this.expire = () =>
        reject(new DatabaseUnavailable('A transaction did nothing for too long.'));
    });
    this.startIdling();
    try {
      return await Promise.race([work(this), expired]);
    } finally {
      this.open = false;
      clearTimeout(this.idle);
    }
  }

  async query(sql: string, params: readonly unknown[] = [], options: QueryOptions = {}) {
    if (!this.open) throw new DatabaseUnavailable('The transaction is over.');
    clearTimeout(this.idle);
    try {
      return await this.connection.query(sql, params, options);
    } finally {
      if (this.open) this.startIdling();
    }
  }

  private startIdling(): void {
    clearTimeout(this.idle);
    this.idle = setTimeout(() => this.expire(), this.idleDeadlineMs);
  }
}
