using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>
/// The schema validator with what the project adds to it and what the standard asks beyond it: quantities, dates in one form only,
/// and words told apart from numbers and flags of the same spelling.
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

        if (schema.Format == "date" && token.Type == JTokenType.String && !IsDate(token.Value<string>()!))
        {
            errors = [.. errors, new ValidationError(ValidationErrorKind.DateExpected, propertyName, propertyPath, token, schema)];
        }

        if (schema.Pattern is { } pattern && pattern.EndsWith('$') && token.Type == JTokenType.String && token.Value<string>()!.EndsWith('\n'))
        {
            // By the standard `$` is the end of the text; to the validator it is also the place before a last line break.
            errors = [.. errors, new ValidationError(ValidationErrorKind.PatternMismatch, propertyName, propertyPath, token, schema)];
        }

        // By the standard, required keys are asked of mappings only.
        return errors.Count == 0 || token is JObject
            ? errors
            : [.. errors.Where(error => error.Kind != ValidationErrorKind.PropertyRequired || !ReferenceEquals(error.Token, token))];
    }

    private static bool IsDate(string text) => DateOnly.TryParseExact(text, "yyyy-MM-dd", out _);

    private static bool IsListed(JToken token, JsonSchema schema) => schema.Enumeration.Count == 0 || schema.Enumeration.Any(word => (word, token.Type) switch
    {
        (string text, JTokenType.String) => text == token.Value<string>(),
        (bool flag, JTokenType.Boolean) => flag == token.Value<bool>(),
        (long or double, JTokenType.Integer or JTokenType.Float) => Convert.ToDouble(word) == token.Value<double>(),
        (null, JTokenType.Null) => true,
        _ => false,
    });
}
