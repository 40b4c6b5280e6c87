import type { MailTransport, OutgoingMail } from './transport';

/** Keeps what it is given; refuses as often as it is told to. */
export class FakeMailTransport implements MailTransport {
	readonly sent: OutgoingMail[] = [];
	refusals = 0;

	async send(mail: OutgoingMail): Promise<void> {
		if (this.refusals > 0) {
			this.refusals--;
			throw new Error('421 try again later');
		}
		this.sent.push(mail);
	}
}
