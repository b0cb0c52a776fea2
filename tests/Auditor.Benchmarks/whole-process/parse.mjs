// Parses designs and validates them against the design schema, and does nothing else.
// Usage: node parse.mjs SCHEMA DESIGN...
import { readFileSync } from "node:fs";
import Ajv from "ajv";
import yaml from "js-yaml";

const [schema, ...designs] = process.argv.slice(2);
const validate = new Ajv({ strict: false, allErrors: true, logger: false }).compile(JSON.parse(readFileSync(schema, "utf8")));
const faults = designs.flatMap((design) => (validate(yaml.load(readFileSync(design, "utf8"), { schema: yaml.CORE_SCHEMA })) ? [] : validate.errors.slice(0, 3)));
console.log(faults.length === 0 ? "valid" : JSON.stringify(faults));
process.exit(faults.length === 0 ? 0 : 1);
