import type { SceneDraft } from './build';
import type { DemoGalaxyIds } from './index';

/** Scenes 9 to 12: without it, how much, another galaxy, and what is not known. */
export function wondering({ wheel, dwarf, orchard }: DemoGalaxyIds): SceneDraft[] {
	const galaxy = { kind: 'galaxy', galaxyId: wheel } as const;
	return [
		{
			title: 'Without it',
			seconds: 120,
			subject: galaxy,
			mix: { haloFactor: 0 },
			motion: { rate: 4, begin: 'go-on' },
			view: { distance: 36, inclination: 62, turn: -20, centreAltitude: 46 },
			drawings: { rings: [15.3] },
			entrance: { kind: 'fade', seconds: 6 },
			note: 'The picture shows how slowly stars would have to go to stay without the halo. It does not show them leave; the words do.',
			script: `
And if we took it away?

What you see now is how slowly the stars would have to go so that the light alone could hold them. But
they are not slow. Look at the ring, at fifty thousand light years. Without the halo, anything there that
moves faster than {escape speed at 50 kly} leaves, and never comes back. The stars there move at
{measured speed at 50 kly}.

So they would go. Not with a bang: each would simply stop turning and sail straight on, out into the
dark. In the time of a turn or two the rim of the Wheel would be gone, and the blue arms with it. Only the
yellow middle would stay.

The Wheel is there. It has been there for billions of years. So whatever holds it has been there
as long.`
		},
		{
			title: 'How much there is',
			seconds: 135,
			subject: galaxy,
			motion: { rate: 3, begin: 'fresh' },
			view: { distance: 38, inclination: 35, turn: -20, centreAltitude: 50 },
			drawings: {
				rings: [9.2, 18.4],
				caption: 'Inside 60,000 light years: {unlit to lit inside 60 kly} as much unlit as lit'
			},
			entrance: { kind: 'fade', seconds: 6 },
			note: 'Read the numbers slowly. The last one is the answer to the question of the evening.',
			script: `
Now we can read the scale.

Inside the small ring, thirty thousand light years: {lit mass inside 30 kly} that shine, and
{unlit mass inside 30 kly} worth of stuff that does not.

Inside the large ring, sixty thousand: {lit mass inside 60 kly} that shine. We have nearly all of the light
now. And of the other: {unlit mass inside 60 kly}. The farther out we go, the more of it there is, and we have
not come to its end.

All together, {mass inside 60 kly}. That is the weight of the Wheel, as far as we can follow it.

And of that, everything you have ever seen in any picture of a galaxy, all the light and colour, is the
smaller part. The bright Wheel is the foam on a dark wave.`
		},
		{
			title: 'Small and large',
			seconds: 115,
			subject: { kind: 'galaxy', galaxyId: dwarf },
			motion: { rate: 5, begin: 'fresh' },
			view: { distance: 14, inclination: 48, turn: 10, centreAltitude: 58 },
			drawings: { name: true, chart: true, chartLit: true, chartTotal: true, chartMeasured: true },
			entrance: { kind: 'fade', seconds: 6 },
			controls: [{ label: 'Halo', target: { kind: 'halo-factor' }, min: 0, max: 2, rest: 1 }],
			note: 'An invented dwarf. Some visitors will ask whether every galaxy is like this; the next scene has one where the light nearly suffices inside.',
			script: `
Perhaps the Wheel is strange? Here is a very different one: the Lamplighter, a dwarf. You could lay several of
them side by side across the Wheel. It has few stars and much gas, and no fine arms.

Its stars are in no hurry: {peak speed} at the most. But look at the amber line. The light explains almost
nothing here, not even near the middle. Inside ten thousand light years it has
{unlit to lit inside 10 kly} as much unlit matter as lit.

It is often so with the small ones: they are the darkest galaxies we know. They are where we look when we
want to learn what the dark stuff is like, because there is so little light in the way.`
		},
		{
			title: 'What we do not know',
			seconds: 110,
			subject: { kind: 'galaxy', galaxyId: orchard },
			motion: { rate: 2, begin: 'fresh' },
			view: { distance: 34, inclination: 55, turn: 25, centreAltitude: 50 },
			drawings: { name: true },
			entrance: { kind: 'fade', seconds: 8 },
			note: 'End in quiet. Questions after; the rest picture is one press away. House lights by hand.',
			script: `
One more, to say good night: the Old Orchard, full of old stars. Near its middle the light very nearly
suffices. At fifteen thousand light years the stars move at {speed at 15 kly}, and the light alone would
give {speed from light at 15 kly}. Far out, again, it does not.

What is it, then? We do not know. Perhaps a particle that nobody has caught yet. Most astronomers think so, and
they have other reasons besides these. Some think that it is the rule of pulling that changes where the
pull is weak. They may not be many, but asking is how we got here.

What we do know is this. Somebody looked at how fast the stars go round, and did not look away when the
answer was odd. Anyone may do that.

Thank you for coming. Stay for a moment, and let it turn.`
		}
	];
}
