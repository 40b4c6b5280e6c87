import type { SceneDraft } from './build';
import type { DemoGalaxyIds } from './index';

/** Scenes 5 to 8: what the light says, what is measured, both at once, and what closes the gap. */
export function weighing({ wheel }: DemoGalaxyIds): SceneDraft[] {
	const galaxy = { kind: 'galaxy', galaxyId: wheel } as const;
	return [
		{
			title: 'What the light says',
			seconds: 150,
			subject: galaxy,
			mix: { haloFactor: 0 },
			motion: { rate: 4, begin: 'fresh' },
			view: { distance: 42, inclination: 45, turn: -20, centreAltitude: 58 },
			drawings: { chart: true, chartLit: true },
			entrance: { kind: 'fade', seconds: 6 },
			note: 'Here the stars move as if the light were all. Wait for the outer disc to fall behind before you name it.',
			script: `
Let us do what astronomers did for most of a hundred years: count the light. Every star shines, and
we know how heavy stars are. Gas shines too, if you look with a radio dish. Add it all up, and inside fifty
thousand light years the Wheel has {lit mass inside 50 kly}.

From that we can work out how hard it pulls, and how fast the stars should go. The amber line on the
chart says it. To the right is farther out; up is faster.

Near the middle, where the stars stand thick, the speed climbs. But then the light thins out, there is
less and less to pull, and the line bends down. At thirty thousand light years: {speed at 30 kly}. At
sixty thousand, only {speed at 60 kly}.

It is the same in our own solar system. The planets far from the Sun are the slow ones. So this is
what everybody expected to find. Remember that line. It goes down.`
		},
		{
			title: 'What was measured',
			seconds: 150,
			subject: galaxy,
			motion: { rate: 4, begin: 'fresh' },
			view: { distance: 42, inclination: 45, turn: -20, centreAltitude: 58 },
			drawings: { chart: true, chartLit: true, chartMeasured: true },
			entrance: { kind: 'fade', seconds: 5 },
			note: 'The points of the Wheel are invented, with honest error bars. The method is the one used on real galaxies since the 1970s.',
			script: `
Then people measured it.

You can tell how fast a star moves from its colour. Light that comes toward us is a little bluer, light
that goes away a little redder, just as a siren sounds higher when it comes and lower when it goes. Point a
telescope at one side of a galaxy and then at the other, and the difference gives you the speed.

Here are the measurements: one ring for each. The small bars say how sure we are.

Close to the middle they lie on the amber line. Well done, light. And now go outward with me. The line
goes down. The rings do not. At thirty thousand light years they say {measured speed at 30 kly}, where
the light could explain {speed from light at 30 kly}. At sixty thousand they still say
{measured speed at 60 kly}.

Not a little too fast. Far too fast. And it is not only this one. Nearly every spiral ever measured
does the same.`
		},
		{
			title: 'Side by side',
			seconds: 130,
			subject: galaxy,
			comparison: 'halves',
			motion: { rate: 4, begin: 'fresh' },
			view: { distance: 36, inclination: 25, turn: 0, centreAltitude: 46 },
			drawings: { rings: [9.2] },
			entrance: { kind: 'fade', seconds: 5 },
			note: 'Give it a good half minute in silence: the difference grows.',
			script: `
So here are both. The same stars, twice. On your left, the Wheel as its light says it should turn. On
your right, the Wheel as it does turn.

In the middle you cannot tell them apart. Look at the rim. On the left it lingers. On the right it
sweeps round as if nobody had told it that the light is running out.

Watch the ring. A star on the right side of it needs {turn time at 30 kly} to come round. A star on the
left needs far longer, and out at the edge the gap only widens.

Nobody did anything to the stars on the right. They are where we found them, going as fast as we found
them. There are only two ways out. Either we have the rules of pulling wrong, or there is something there
that pulls and does not shine.`
		},
		{
			title: 'What the halo adds',
			seconds: 155,
			subject: galaxy,
			motion: { rate: 4 },
			view: { distance: 42, inclination: 45, turn: -20, centreAltitude: 58 },
			drawings: { chart: true, chartLit: true, chartTotal: true, chartMeasured: true },
			entrance: { kind: 'fade', seconds: 6 },
			controls: [
				{ label: 'Halo', target: { kind: 'halo-factor' }, min: 0, max: 2, rest: 1 },
				{ label: 'Passing time', target: { kind: 'rate' }, min: 0, max: 8, rest: 4 }
			],
			note: 'Begin with the halo at none, raise it slowly to once, and stop where the line meets the points. If someone asks “what if there were twice as much?”, show it.',
			script: `
Let us try the second way. Suppose that the Wheel sits in a great round cloud of something that gives no
light at all. Astronomers call it the halo, and what it is made of they call dark matter. That is not
an explanation yet. It is a name for a place where one is missing.

I have a slider here. At nothing, the white line lies on the amber one: light alone. Now I add the halo.
Watch the line, and watch the stars at the rim.

Up it goes, and there: it runs through every point, from the middle to the edge. One round, smooth, dark
cloud, and everything fits.

Too much is wrong as well. Twice as much, and the stars would race, and the line misses the points from above.
The measurements do not let us have just any amount. That is what it means to weigh.

What shall we try? You may choose.`
		}
	];
}
