import * as z from 'zod';

type Schema = z.core.JSONSchema.BaseSchema;

/** JSON Schema of what a contract takes (`input`) or gives (`output`). */
export function schemaOf(contract: z.ZodType, side: 'input' | 'output'): Schema {
  const { $schema: _dialect, ...schema } = z.toJSONSchema(contract, {
    io: side,
    unrepresentable: 'any',
    override: ({ zodSchema, jsonSchema }) => {
      // What we answer may gain fields; only what is strict on purpose refuses others.
      const { def } = zodSchema._zod;
      if (def.type === 'object' && !('catchall' in def && def.catchall)) {
        delete jsonSchema.additionalProperties;
      }
    },
  });
  return schema;
}
