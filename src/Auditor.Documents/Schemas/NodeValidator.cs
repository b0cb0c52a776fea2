using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>
/// The schema validator with what the project adds to it and what the standard asks beyond it: quantities, words told apart from
/// numbers and flags of the same spelling, and no missing keys where keys could merely not be read.
/// </summary>
/// <param name="ruleOf">Returns the quantity rule of a schema, or null.</param>
internal sealed class NodeValidator(Func<JsonSchema, QuantityRule?> ruleOf) : JsonSchemaValidator
{
    protected override ICollection<ValidationError> Validate(
        JToken token, JsonSchema schema, SchemaType schemaType, string? propertyName, string propertyPath)
    {
        if (schema.Enumeration.Count > 0 && token is JContainer)
        {
            // Words are never mappings or lists; the validator would write the whole value out once for every word.
            return [new ValidationError(ValidationErrorKind.NotInEnumeration, propertyName, propertyPath, token, schema)];
        }

        if (token is JValue && NodeTokens.NodeOf(token) is ScalarNode { Kind: not ScalarKind.Null } scalar && ruleOf(schema)?.Check(scalar) is { } problem)
        {
            return [new QuantityError(problem, token, schema)];
        }

        var errors = base.Validate(token, schema, schemaType, propertyName, propertyPath);
        if (!IsListed(token, schema))
        {
            // A wrong word says more than a wrong type, and one of them is enough.
            return [new ValidationError(ValidationErrorKind.NotInEnumeration, propertyName, propertyPath, token, schema)];
        }

        return errors.Count == 0 ? errors : [.. errors.Where(error => !ReferenceEquals(error.Token, token) || !IsMoot(error.Kind, token))];
    }

    private static bool IsMoot(ValidationErrorKind kind, JToken token) => kind switch
    {
        ValidationErrorKind.PropertyRequired => token is not JObject || NodeTokens.NodeOf(token).IsPartial,
        ValidationErrorKind.TooFewProperties or ValidationErrorKind.TooFewItems => NodeTokens.NodeOf(token).IsPartial,
        _ => false,
    };

    private static bool IsListed(JToken token, JsonSchema schema) => schema.Enumeration.Count == 0 || schema.Enumeration.Any(word => (word, token.Type) switch
    {
        (string text, JTokenType.String) => text == token.Value<string>(),
        (bool flag, JTokenType.Boolean) => flag == token.Value<bool>(),
        (long or double, JTokenType.Integer or JTokenType.Float) => Convert.ToDouble(word) == token.Value<double>(),
        (null, JTokenType.Null) => true,
        _ => false,
    });
}
