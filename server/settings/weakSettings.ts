interface Settings {
  readonly mode: string;
  readonly host: string;
  readonly publicUrl: string | null;
  readonly databaseUrl: string;
  readonly sessionKeys: readonly string[];
  readonly demo: boolean;
  readonly testNow: Date | null;
}

const LOOPBACK = new Set(['127.0.0.1', '::1', '[::1]', 'localhost']);
export const isLoopback = (host: string): boolean => LOOPBACK.has(host);

/** What must not stand in front of people: a sentence for each setting that is missing or weak. */
export function weakSettings(config: Settings): string[] {
  const sentences = demoAbroad(config);
  if (config.testNow !== null && config.mode !== 'test')
    sentences.push('TEST_NOW belongs to tests.');
  if (config.mode === 'serve') {
    sentences.push(
      ...weakKeys(config.sessionKeys),
      ...weakAddress(config),
      ...weakDatabase(config),
    );
  }
  return sentences;
}

function demoAbroad(config: Settings): string[] {
  if (!config.demo) return [];
  if (config.mode === 'serve') {
    return ['DEMO makes accounts whose password is public: it has no place in a deployment.'];
  }
  const open =
    !isLoopback(config.host) ||
    (config.publicUrl !== null && !isLoopback(new URL(config.publicUrl).hostname));
  return open
    ? [
        'The demo accounts have a public password, so HOST must stay 127.0.0.1; start with DEMO=no to open it.',
      ]
    : [];
}

function weakKeys(keys: readonly string[]): string[] {
  if (keys.length < 2 || new Set(keys).size < keys.length) {
    return [
      'SESSION_KEYS needs two different keys, the newest first, so that they can be changed in turn.',
    ];
  }
  const weak = keys.some((key) => key.length < 32 || new Set(key).size < 10);
  return weak
    ? [
        'Each of SESSION_KEYS must be random and 32 characters or longer: openssl rand -hex 32 makes one.',
      ]
    : [];
}

function weakAddress(config: Settings): string[] {
  if (config.publicUrl === null) {
    return ['Set PUBLIC_URL to the address that people use, such as https://brews.example.'];
  }
  const { protocol, hostname } = new URL(config.publicUrl);
  return protocol === 'https:' || (protocol === 'http:' && isLoopback(hostname))
    ? []
    : ['PUBLIC_URL must begin with https://: over plain http a session could be read on the way.'];
}

function weakDatabase(config: Settings): string[] {
  if (!URL.canParse(config.databaseUrl)) {
    return ['DATABASE_URL cannot be read: write special characters in the password as %XX.'];
  }
  const url = new URL(config.databaseUrl);
  const reachable = url.hostname !== '' && !isLoopback(url.hostname);
  return reachable && url.password.length < 12
    ? ['The password in DATABASE_URL must have 12 characters or more.']
    : [];
}
