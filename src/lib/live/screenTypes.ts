/** The run a screen follows, as `/api/screen` and `run` frames name it. */
export interface FollowedRun {
	runId: string;
	editionId: string;
	/** SHA-256 of the edition's content, hex. */
	hash: string;
}

/** What `GET /api/screen` answers: who this browser is. */
export interface ScreenIdentity {
	screen: { id: string; name: string };
	dome: {
		id: string;
		name: string;
		apertureDegrees: number;
		tiltDegrees: number;
		filmSize: number;
		painter: 'auto' | 'plain' | 'webgl';
	};
	run: FollowedRun | null;
}
