import type { SceneDraft } from './build';
import type { DemoGalaxyIds } from './index';

/** Scenes 1 to 4: the audience arrives, the eyes settle, the galaxy is met. */
export function arriving({ wheel }: DemoGalaxyIds): SceneDraft[] {
	const galaxy = { kind: 'galaxy', galaxyId: wheel } as const;
	return [
		{
			title: 'Doors',
			seconds: 95,
			subject: { kind: 'dark', name: 'The weight of the Wheel' },
			motion: { rate: 0, begin: 'fresh' },
			entrance: { kind: 'fade', seconds: 3 },
			note: 'House lights by hand. Begin when the last people sit. Point to the exits as you name them.',
			script: `
Good evening, and welcome under the dome.

Before the light goes: the way out is behind you, left and right, and the signs stay lit the whole
time. In a minute it will be very dark, and soon the whole sky will move. If that makes you dizzy,
close your eyes. The floor is not moving, only the picture. If you feel unwell, raise a hand or
call out, and we bring up the lights. Nobody will mind.

Please turn off anything that shines or rings.

Tonight we are going to weigh something. We shall not touch it, we cannot visit it, and no scale
would hold it. All we have is its light, and a question a child could ask: how fast does it go
round?`
		},
		{
			title: 'Eyes to the dark',
			seconds: 90,
			subject: { kind: 'dark', name: '' },
			motion: { rate: 0, begin: 'fresh' },
			entrance: { kind: 'fade', seconds: 6 },
			note: 'House lights down slowly, by hand, while you speak. Leave a silence at the end.',
			script: `
Let your eyes rest on the dark. They need some minutes, and they will reward you.

Every star you see on a clear night belongs to one family of stars. It is so large that light, the
fastest thing there is, needs about a hundred thousand years from one side to the other. We live
inside it, so we never see it whole.

To see one whole, we have to look far beyond our own. So let us go and find another.

Nothing to do for a moment but look up.`
		},
		{
			title: 'The Harrow Wheel',
			seconds: 125,
			subject: galaxy,
			motion: { rate: 1.5, begin: 'fresh' },
			view: { distance: 34, inclination: 28, turn: -20, centreAltitude: 52 },
			drawings: { name: true },
			entrance: { kind: 'fade', seconds: 10 },
			note: 'The Wheel is an invented galaxy, made for this house. Say so if anyone asks; real ones of this kind behave the same way.',
			script: `
Here it is. We call it the Harrow Wheel. We made it up, so that we may take it apart later without
hurting anyone; but it is built by the same rules as the real ones.

In the middle is a warm, yellow crowd of old stars. Around it lies a disc, as
flat as a vinyl record. The blue curves are places where new stars are being born. The pink spots are clouds of
gas that young stars have set aglow. And the dark gaps are dust: soot, made by stars long gone.

Look for a while at one pink spot. You will find that it moves.

A true galaxy is slower than this one. Every second that passes here is one and a half million
years. In all of human history, nobody could have seen it stir.`
		},
		{
			title: 'Going round',
			seconds: 125,
			subject: galaxy,
			colour: 'speed',
			motion: { rate: 3 },
			view: { distance: 36, inclination: 40, turn: -20, centreAltitude: 54 },
			drawings: { rings: [9.2], scale: true },
			entrance: { kind: 'fade', seconds: 6 },
			controls: [{ label: 'Passing time', target: { kind: 'rate' }, min: 0, max: 8, rest: 3 }],
			note: 'Let the ring be found before you give the number. The slider slows or stops the Wheel.',
			script: `
Now every star is painted by its speed. Blue is slow, yellow is fast. The marks along the bottom say
how fast.

Find the thin ring. It lies thirty thousand light years from the middle, a little farther out than our
own Sun is in our own galaxy. The stars there travel at {speed at 30 kly}. While I say this one
sentence, each of them goes farther than from London to Rome.

And still, one turn of the Wheel takes them {turn time at 30 kly}. When they were last on this side,
no dinosaur had yet drawn breath.

Why do they go round at all, and not straight on? Something holds them. Something pulls. And here is
the trick of the evening: the faster they go, the harder it must be pulling.`
		}
	];
}
