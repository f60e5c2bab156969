import { SMTPServer } from 'smtp-server';
import type { LetterStore } from './letter-store';

const LETTER_BYTES_AT_MOST = 20 * 1024 * 1024;

/** Takes every letter for everybody and sends none on. */
export function receivingServer(store: LetterStore): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    size: LETTER_BYTES_AT_MOST,
    onData: (stream, _session, callback) => {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('error', callback);
      stream.on('end', () => {
        if (stream.sizeExceeded) return callback(new Error('The letter is too large.'));
        store.keep(Buffer.concat(parts)).then(() => callback(), callback);
      });
    },
  });
}
