// Parses a design and validates it against the design schema, and does nothing else.
// Usage: node parse.mjs SCHEMA DESIGN
import { readFileSync } from "node:fs";
import Ajv from "ajv";
import yaml from "js-yaml";

const [schema, design] = process.argv.slice(2).map((path) => readFileSync(path, "utf8"));
const validate = new Ajv({ strict: false, allErrors: true, logger: false }).compile(JSON.parse(schema));
const isValid = validate(yaml.load(design, { schema: yaml.CORE_SCHEMA }));
console.log(isValid ? "valid" : JSON.stringify(validate.errors.slice(0, 3)));
process.exit(isValid ? 0 : 1);
