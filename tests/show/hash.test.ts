import { describe, expect, it } from 'vitest';
import { canonicalJson, sha256Hex } from '../../src/lib/show/hash';

describe('canonicalJson', () => {
	it('writes one text for one value, whatever the order of its keys', () => {
		expect(canonicalJson({ b: [1, { d: null, c: 'é' }], a: true })).toBe(
			canonicalJson({ a: true, b: [1, { c: 'é', d: null }] })
		);
		expect(canonicalJson({ b: 1, a: undefined })).toBe('{"b":1}');
	});
	it('refuses what JSON cannot hold', () => {
		expect(() => canonicalJson({ a: NaN })).toThrow('NaN');
		expect(() => canonicalJson([undefined])).toThrow('undefined');
	});
});

describe('sha256Hex', () => {
	it('agrees with the worked example of FIPS 180-4 for "abc"', async () => {
		// FIPS 180-2, appendix B.1, one-block message.
		expect(await sha256Hex('abc')).toBe(
			'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'
		);
	});
});
