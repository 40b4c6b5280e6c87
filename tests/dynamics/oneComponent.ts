import {
	massModel,
	type ComponentKind,
	type MassModel,
	type Parameters
} from '../../src/lib/dynamics/index';

/** A model of a single component with the id "it". */
export function oneComponent(kind: ComponentKind, parameters: Parameters): MassModel {
	return massModel({ components: [{ id: 'it', kind, parameters, lit: true }] });
}
