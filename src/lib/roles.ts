/** The five roles a person may hold in a venue; one person may hold several. */
export const roles = ['producer', 'adviser', 'presenter', 'technician', 'manager'] as const;
export type Role = (typeof roles)[number];

export const roleInfo: Record<Role, { label: string; does: string }> = {
	producer: { label: 'Producer', does: 'writes shows and galaxies and freezes editions' },
	adviser: { label: 'Adviser', does: 'checks the science; reads everything, changes nothing' },
	presenter: { label: 'Presenter', does: 'rehearses, runs the show and writes its log' },
	technician: { label: 'Technician', does: 'sets up domes and pairs screens' },
	manager: { label: 'Manager', does: 'looks after people and may do everything in the venue' }
};
