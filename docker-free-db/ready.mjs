// Is a MariaDB answering? The server speaks first: packet header (4 bytes), then protocol version 10.
import { connect } from 'node:net';

export function answers(port, patience = 1000) {
  return new Promise((resolve) => {
    const socket = connect({ host: '127.0.0.1', port });
    const done = (result) => {
      socket.destroy();
      resolve(result);
    };
    socket.setTimeout(patience, () => done(false));
    socket.once('error', () => done(false));
    socket.once('close', () => resolve(false));
    socket.once('data', (chunk) => done(chunk[4] === 10));
  });
}
