import pg from 'pg';

/**
 * A connection that outlives its server: when PostgreSQL goes away, the pool replaces the connection at its next use.
 * Without a listener of its own the loss would end the process.
 */
export class PatientClient extends pg.Client {
  constructor(config?: pg.ClientConfig) {
    super(config);
    this.on('error', () => undefined);
  }
}
