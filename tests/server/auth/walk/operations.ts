/** What the walk needs of an OpenAPI schema, as the document has it. */
interface Schema {
  readonly $ref?: string;
  readonly format?: string;
  readonly properties?: Readonly<Record<string, Schema>>;
  readonly items?: Schema;
  readonly anyOf?: readonly Schema[];
  readonly oneOf?: readonly Schema[];
  readonly allOf?: readonly Schema[];
}

interface Described {
  readonly requestBody?: { readonly content: Readonly<Record<string, { readonly schema: Schema }>> };
  readonly responses: Readonly<Record<string, unknown>>;
}

interface OpenApi {
  readonly paths: Readonly<Record<string, Readonly<Record<string, Described>>>>;
  readonly components: { readonly schemas: Readonly<Record<string, Schema>> };
}

/** One route as the document describes it. */
export interface Operation {
  /** `POST /api/projects/{projectId}/plants` */
  readonly name: string;
  readonly method: string;
  readonly path: string;
  /** Names of the path's parameters that are ids of things. */
  readonly pathIds: readonly string[];
  /** Names of the body's fields that are ids of things, at any depth. */
  readonly bodyIds: readonly string[];
  /** Names of the body's own fields; null where no body is taken. */
  readonly fields: readonly string[] | null;
  readonly successes: readonly number[];
}

const REFERENCE = '#/components/schemas/';

/** Every field of a schema with its own schema, at any depth; a schema that holds itself is walked once. */
function fieldsOf(document: OpenApi, schema: Schema, walked = new Set<Schema>()): [string, Schema][] {
  if (walked.has(schema)) return [];
  walked.add(schema);
  if (schema.$ref) return fieldsOf(document, document.components.schemas[schema.$ref.slice(REFERENCE.length)], walked);
  const inner = [schema.items, ...(schema.anyOf ?? []), ...(schema.oneOf ?? []), ...(schema.allOf ?? [])].filter(
    (one) => one !== undefined,
  );
  const own = Object.entries(schema.properties ?? {});
  return [...own, ...[...inner, ...own.map(([, field]) => field)].flatMap((one) => fieldsOf(document, one, walked))];
}

function topLevel(document: OpenApi, schema: Schema): string[] {
  if (schema.$ref) return topLevel(document, document.components.schemas[schema.$ref.slice(REFERENCE.length)]);
  return [
    ...Object.keys(schema.properties ?? {}),
    ...[...(schema.anyOf ?? []), ...(schema.oneOf ?? [])].flatMap((one) => topLevel(document, one)),
  ];
}

const isId = ({ format, items, anyOf }: Schema): boolean =>
  format === 'uuid' || (items !== undefined && isId(items)) || (anyOf ?? []).some(isId);

function operationsOf(document: OpenApi): Operation[] {
  return Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, { requestBody, responses }]) => {
      const body = requestBody?.content['application/json']?.schema;
      const fields = body ? fieldsOf(document, body) : [];
      return {
        name: `${method.toUpperCase()} ${path}`,
        method: method.toUpperCase(),
        path,
        pathIds: [...path.matchAll(/\{(\w+Id)\}/g)].map(([, name]) => name),
        bodyIds: [...new Set(fields.filter(([, schema]) => isId(schema)).map(([name]) => name))],
        fields: body ? topLevel(document, body) : null,
        successes: Object.keys(responses)
          .map(Number)
          .filter((status) => status < 400),
      };
    }),
  );
}

/** Everything that a running server's document describes. */
export async function documentAt(url: string): Promise<Operation[]> {
  const response = await fetch(`${url}/api/openapi.json`);
  return operationsOf((await response.json()) as OpenApi);
}
