import { beforeAll, describe, expect, it } from 'vitest';
import { ask, everyHandler, servedDatabase } from './ask';

interface Described {
	openapi: string;
	paths: Record<
		string,
		Record<string, { requestBody?: unknown; responses: object; parameters: { name: string }[] }>
	>;
	components: { schemas: Record<string, { oneOf?: unknown[]; anyOf?: unknown[]; properties?: object }> };
}
let api: Described;
beforeAll(async () => {
	await servedDatabase();
	api = await (await ask('GET /api/openapi.json', null)).json();
});

describe('the API’s description', () => {
	it('lists every route and method there is, and the two that watch over it', async () => {
		const described = Object.entries(api.paths).flatMap(([path, methods]) =>
			Object.keys(methods).map((method) => `${method.toUpperCase()} ${path}`)
		);
		expect(described.sort()).toEqual([...(await everyHandler()), 'GET /healthz', 'GET /readyz'].sort());
	});

	it('has every schema that it points to', () => {
		const refs = [...JSON.stringify(api).matchAll(/"\$ref":"([^"]+)"/g)].map(([, ref]) => ref!);
		expect(refs.length).toBeGreaterThan(20);
		const stray = refs.filter((ref) => {
			const name = ref.replace('#/components/schemas/', '');
			return !(name in api.components.schemas);
		});
		expect(stray).toEqual([]);
	});

	it('names each part of a path as a parameter', () => {
		for (const [path, methods] of Object.entries(api.paths)) {
			const parts = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
			for (const { parameters } of Object.values(methods)) {
				expect(parameters.map(({ name }) => name)).toEqual(expect.arrayContaining(parts));
			}
		}
	});

	it('says what a bill and a supply are by the schemas that read them', () => {
		expect(api.openapi).toBe('3.1.0');
		expect(Object.keys(api.components.schemas.Bill!.properties!)).toEqual(
			expect.arrayContaining(['slots', 'pieces', 'adhesives', 'tools'])
		);
		expect(api.components.schemas.Supply!.oneOf ?? api.components.schemas.Supply!.anyOf).toHaveLength(5);
	});
});
