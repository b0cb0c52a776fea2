using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>Unfolds the nested errors of the validator to those at the innermost places, following the alternative that fits best.</summary>
internal static class ErrorUnfolding
{
    /// <summary>Returns the errors that stand for an error: those inside it, or itself where they would say less.</summary>
    public static IEnumerable<ValidationError> Unfold(ValidationError error) => error switch
    {
        ChildSchemaValidationError { Kind: ValidationErrorKind.NotOneOf or ValidationErrorKind.NotAnyOf } choice => UnfoldChoice(choice),
        ChildSchemaValidationError nested => nested.Errors.Values.SelectMany(errors => errors).SelectMany(Unfold),
        MultiTypeValidationError types => UnfoldTypes(types),
        _ => [error],
    };

    /// <summary>Whether an error says that a value is of a wrong type altogether.</summary>
    public static bool IsWrongType(ValidationError error) => error.Kind is ValidationErrorKind.StringExpected or ValidationErrorKind.NumberExpected
        or ValidationErrorKind.IntegerExpected or ValidationErrorKind.BooleanExpected or ValidationErrorKind.ObjectExpected
        or ValidationErrorKind.ArrayExpected or ValidationErrorKind.NullExpected or ValidationErrorKind.NoTypeValidates
        || (error.Kind == ValidationErrorKind.NotInEnumeration && error.Token is JContainer);

    private static List<ValidationError> UnfoldChoice(ChildSchemaValidationError choice)
    {
        var branches = choice.Errors.Values.Select(errors => errors.SelectMany(Unfold).ToList()).ToList();
        if (branches.Exists(errors => errors.Count == 0) || branches.TrueForAll(errors => LacksOnly(errors, choice.Token)))
        {
            return [choice];
        }

        var best = branches.MinBy(errors => errors.Sum(error => Weight(error, choice.Token)))!;
        return best.Exists(error => IsWrongType(error) && ReferenceEquals(error.Token, choice.Token)) ? [choice] : best;
    }

    private static bool LacksOnly(List<ValidationError> errors, JToken? token)
        => errors.TrueForAll(error => error.Kind == ValidationErrorKind.PropertyRequired && ReferenceEquals(error.Token, token));

    private static IEnumerable<ValidationError> UnfoldTypes(MultiTypeValidationError types)
    {
        var fitting = types.Errors.Values.FirstOrDefault(errors => !errors.Any(IsWrongType));
        return fitting is null ? [types] : fitting.SelectMany(Unfold);
    }

    /// <summary>How far an error tells against the alternative that it comes from.</summary>
    private static int Weight(ValidationError error, JToken? token) => error.Kind switch
    {
        _ when IsWrongType(error) => ReferenceEquals(error.Token, token) ? 10_000 : 3,
        ValidationErrorKind.NotInEnumeration when error.Schema.Enumeration.Count == 1 => 100,
        ValidationErrorKind.NotInEnumeration => NearestWord.Find(error.Token?.ToString() ?? "", Words(error.Schema)) is null ? 4 : 1,
        ValidationErrorKind.NoAdditionalPropertiesAllowed or ValidationErrorKind.PropertyRequired => 10,
        _ => StartsLikeNumber(error.Token) ? 2 : 5,
    };

    private static IEnumerable<string> Words(JsonSchema schema) => schema.Enumeration.Select(word => word?.ToString() ?? "null");

    private static bool StartsLikeNumber(JToken? token) => token is JValue { Value: string { Length: > 0 } text } && text[0] is >= '0' and <= '9' or '-' or '+' or '.' or '±';
}
