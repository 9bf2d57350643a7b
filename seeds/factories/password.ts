/** Every factory person's password. In a file of its own, so that reading it opens no connection. */
export const FACTORY_PASSWORD = 'correct horse battery staple';
