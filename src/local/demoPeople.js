/**
 * The people of the demo. The start command prints them, the demo seeder makes them; they exist on
 * the stand-in database only. Venues, names and addresses are invented (example.org).
 *
 * @typedef {'producer' | 'adviser' | 'presenter' | 'technician' | 'manager'} Role
 * @typedef {{ name: string, timeZone: string, domes: string[] }} DemoVenue
 * @typedef {{ name: string, email: string, roles: Role[], venue: string }} DemoPerson
 */

/** One password for everybody in the demo, so that trying a role is one click. */
export const demoPassword = 'lanterns over the far hill';

/** @type {DemoVenue[]} */
export const demoVenues = [
	{
		name: 'Lantern Hill Science Centre',
		timeZone: 'Europe/London',
		domes: ['Great Dome', 'Travelling Dome']
	},
	{ name: 'Saltmarsh Observatory House', timeZone: 'Europe/London', domes: [] }
];

/** @type {DemoPerson[]} */
export const demoPeople = [
	{
		name: 'Pia Overton',
		email: 'producer@lanternhill.example.org',
		roles: ['producer'],
		venue: 'Lantern Hill Science Centre'
	},
	{
		name: 'Amos Verrill',
		email: 'adviser@lanternhill.example.org',
		roles: ['adviser'],
		venue: 'Lantern Hill Science Centre'
	},
	{
		name: 'Petra Lindqvist',
		email: 'presenter@lanternhill.example.org',
		roles: ['presenter'],
		venue: 'Lantern Hill Science Centre'
	},
	{
		name: 'Tomas Ashby',
		email: 'technician@lanternhill.example.org',
		roles: ['technician'],
		venue: 'Lantern Hill Science Centre'
	},
	{
		name: 'Maren Hollis',
		email: 'manager@lanternhill.example.org',
		roles: ['manager'],
		venue: 'Lantern Hill Science Centre'
	},
	{
		name: 'Prue Saltonby',
		email: 'producer@saltmarsh.example.org',
		roles: ['producer'],
		venue: 'Saltmarsh Observatory House'
	}
];
