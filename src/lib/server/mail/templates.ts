import { roleInfo, type Role } from '../../roles';
import { mailText, type MailText } from './mailText';

export interface InvitationMail {
	venueName: string;
	/** Null where the installation itself invites its first manager. */
	invitedBy: string | null;
	roles: readonly Role[];
	link: string;
}

export function invitationMail({ venueName, invitedBy, roles, link }: InvitationMail): MailText {
	const asWhat = roles.map((role) => roleInfo[role].label.toLowerCase()).join(', ');
	return mailText(`Join ${venueName} on Farwheel`, {
		before: [
			invitedBy
				? `${invitedBy} invites you to join ${venueName} on Farwheel as ${asWhat}.`
				: `${venueName} is set up on Farwheel, and you are to be its ${asWhat}.`
		],
		link,
		button: 'Join the venue',
		after: [
			'The link works once and for seven days.',
			'If you do not know what this is about, do nothing: without the link nothing happens.'
		]
	});
}

export function resetMail({ name, link }: { name: string; link: string }): MailText {
	return mailText('Choose a new password for Farwheel', {
		before: [`Hello ${name},`, 'somebody, probably you, asked for a new password at Farwheel.'],
		link,
		button: 'Choose a new password',
		after: [
			'The link works once and for one hour. Using it signs you out everywhere.',
			'If it was not you, do nothing: your password stays as it is.'
		]
	});
}

export function signInMail({ link }: { link: string }): MailText {
	return mailText('Sign in to Farwheel', {
		before: ['Here is the link you asked for.'],
		link,
		button: 'Sign in',
		after: [
			'The link works once and for fifteen minutes.',
			'If you did not ask for it, do nothing.'
		]
	});
}
