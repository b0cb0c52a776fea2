using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>A quantity that its schema refuses, on its way through the validator.</summary>
internal sealed class QuantityError(Problem problem, JToken token, JsonSchema schema)
    : ValidationError(ValidationErrorKind.Unknown, null, null, token, schema)
{
    public Problem Problem { get; } = problem;
}
