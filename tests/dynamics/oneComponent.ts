import { massModel, type ComponentKind, type MassModel } from '../../src/lib/dynamics/index';

/** A model of a single component with the id "it". */
export function oneComponent(kind: ComponentKind, parameters: Record<string, number>): MassModel {
	return massModel({ components: [{ id: 'it', kind, parameters, lit: true }] });
}
