type Mode = 'demo' | 'production' | 'test';

/** Everything the server and the worker take from their surroundings; read once at start. */
export interface Config {
  readonly mode: Mode;
  /** Address the server binds to; loopback unless told otherwise. */
  readonly host: string;
  readonly port: number;
  /** Origin that people see in the address bar; links in e-mails begin with it. No trailing slash. */
  readonly publicUrl: string;
  readonly databaseUrl: string;
  readonly secret: string;
  readonly smtpUrl: string | null;
  readonly mailFrom: string;
  /** Port of the loopback mail catcher, null when it is off. */
  readonly mailCatcherPort: number | null;
  /** Folder of the built web application, null to serve the API alone. */
  readonly webDist: string | null;
  readonly logLevel: string;
  /** bcrypt cost: 2^cost rounds. */
  readonly passwordCost: number;
  readonly signInFailuresAllowed: number;
  readonly databasePoolSize: number;
}

/** Cookies are marked Secure, and HSTS is sent, when people reach the server over TLS. */
export const servedOverTls = (config: Config): boolean => config.publicUrl.startsWith('https://');
