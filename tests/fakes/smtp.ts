// The demonstration's mail server, a process of its own: SMTP_PORT, and letters under DATA_DIR/mail.
import { join } from 'node:path';
import { startFakeMail } from './mail-server';

const { SMTP_PORT = '2525', DATA_DIR = 'data' } = process.env;
const mail = await startFakeMail(join(DATA_DIR, 'mail'), Number(SMTP_PORT));
for (const signal of ['SIGINT', 'SIGTERM'] as const) {
	process.on(signal, () => void mail.close().then(() => process.exit(0)));
}
