export {
	archiveDome,
	createDome,
	listDomes,
	readDome,
	updateDome,
	type Dome,
	type DomeListed
} from './domes';
export {
	domeSettingsSchema,
	filmSizes,
	initialDomeSettings,
	painterChoices,
	type DomeSettings
} from './domeSettings';
export { claimPairing, pairingMinutes, requestPairing, typePairingCode } from './pairing';
export {
	inTouchSeconds,
	isInTouch,
	listScreens,
	revokeScreen,
	screenByToken,
	screenSeen,
	type Screen,
	type ScreenShown
} from './screens';
