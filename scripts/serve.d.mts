export function startServer(options?: {
  root?: string;
  port?: number;
  host?: string;
  tls?: { key: string | Buffer; cert: string | Buffer };
}): Promise<{ address: string; close: () => Promise<void> }>;
