import { createTransport } from 'nodemailer';
import { environment } from '../env';
import type { MailText } from './mailText';

export interface OutgoingMail extends MailText {
	to: string;
	/** Same for every try of one letter, so that a receiver can tell copies. */
	messageId: string;
}

/** Where mail goes out. `FakeMailTransport` stands in for it in tests. */
export interface MailTransport {
	/** @throws where the server did not take it */
	send(mail: OutgoingMail): Promise<void>;
}

/** The SMTP server of the environment. */
export function smtpTransport(): MailTransport {
	const { SMTP_URL, MAIL_FROM } = environment();
	const transporter = createTransport({
		url: SMTP_URL,
		connectionTimeout: 20_000,
		greetingTimeout: 20_000,
		socketTimeout: 40_000
	});
	return {
		async send(mail) {
			await transporter.sendMail({ from: MAIL_FROM, ...mail });
		}
	};
}
