using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>
/// Unfolds the nested errors of the validator to those at the innermost places, following the alternative that fits best, and leaves
/// out what follows from something that is reported anyway.
/// </summary>
internal static class ErrorUnfolding
{
    /// <summary>Returns the errors to report for those that the validator gives.</summary>
    public static IEnumerable<ValidationError> Unfold(IEnumerable<ValidationError> errors)
    {
        var unfolded = errors.SelectMany(Unfold).ToList();
        var mistyped = unfolded.Where(IsWrongType).Select(error => error.Token!).ToHashSet(ReferenceEqualityComparer.Instance);
        var misspelt = unfolded.Where(error => error.Kind == ValidationErrorKind.NoAdditionalPropertiesAllowed)
            .Select(error => (error.Token!.Parent, KeySuggestion.For((JProperty)error.Token!, error.Schema))).ToHashSet();
        return unfolded.Where(error => IsWrongType(error) || !mistyped.Contains(error.Token!))
            .Where(error => error.Kind != ValidationErrorKind.PropertyRequired || !misspelt.Contains((error.Token as JContainer, error.Property)));
    }

    /// <summary>Whether an error says that a value is of a wrong type altogether.</summary>
    public static bool IsWrongType(ValidationError error) => error.Kind is ValidationErrorKind.StringExpected or ValidationErrorKind.NumberExpected
        or ValidationErrorKind.IntegerExpected or ValidationErrorKind.BooleanExpected or ValidationErrorKind.ObjectExpected
        or ValidationErrorKind.ArrayExpected or ValidationErrorKind.NullExpected or ValidationErrorKind.NoTypeValidates
        || (error.Kind == ValidationErrorKind.NotInEnumeration && error.Token is JContainer);

    private static IEnumerable<ValidationError> Unfold(ValidationError error) => error switch
    {
        ChildSchemaValidationError { Kind: ValidationErrorKind.NotOneOf or ValidationErrorKind.NotAnyOf } choice => UnfoldChoice(choice),
        ChildSchemaValidationError nested => nested.Errors.Values.SelectMany(errors => errors).SelectMany(Unfold),
        MultiTypeValidationError types => UnfoldTypes(types),
        _ when IsMoot(error) => [],
        _ => [error],
    };

    /// <summary>Whether an error misses what may merely not have been read.</summary>
    private static bool IsMoot(ValidationError error)
        => error.Kind is ValidationErrorKind.PropertyRequired or ValidationErrorKind.TooFewProperties or ValidationErrorKind.TooFewItems
            && NodeTokens.NodeOf(error.Token!).IsPartial;

    private static List<ValidationError> UnfoldChoice(ChildSchemaValidationError choice)
    {
        if (choice.Errors.Values.Any(errors => errors.Count == 0))
        {
            return [choice];
        }

        var branches = choice.Errors.Values.Select(errors => errors.SelectMany(Unfold).ToList()).ToList();
        if (branches.Exists(errors => errors.Count == 0))
        {
            return [];
        }

        if (branches.TrueForAll(errors => LacksOnly(errors, choice.Token)))
        {
            return [choice];
        }

        if (UnknownInAll(branches) is { } unknown)
        {
            return [unknown];
        }

        var best = branches.MinBy(errors => errors.Sum(error => Weight(error, choice.Token)))!;
        return best.Exists(error => IsWrongType(error) && ReferenceEquals(error.Token, choice.Token)) ? [choice] : best;
    }

    private static bool LacksOnly(List<ValidationError> errors, JToken? token)
        => errors.TrueForAll(error => error.Kind == ValidationErrorKind.PropertyRequired && ReferenceEquals(error.Token, token));

    /// <summary>Where the word that tells the alternatives apart is in none of them, that word is wrong: all their words are allowed.</summary>
    private static ValidationError? UnknownInAll(List<List<ValidationError>> branches)
    {
        var wrong = branches.ConvertAll(errors => errors.Find(error => error.Kind == ValidationErrorKind.NotInEnumeration && error.Token is JValue));
        var first = wrong[0];
        if (wrong.Count < 2 || first is null || !wrong.TrueForAll(error => ReferenceEquals(error?.Token, first.Token)))
        {
            return null;
        }

        var all = new JsonSchema { Title = first.Schema.Title };
        foreach (var word in wrong.SelectMany(error => error!.Schema.Enumeration).Distinct())
        {
            all.Enumeration.Add(word);
        }

        return new ValidationError(first.Kind, first.Property, first.Path, first.Token, all);
    }

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
        ValidationErrorKind.NotInEnumeration => NearestWord.Find(error.Token?.ToString() ?? "", ExpectedValue.Words(error.Schema)) is null ? 4 : 1,
        ValidationErrorKind.NoAdditionalPropertiesAllowed or ValidationErrorKind.PropertyRequired => 10,
        _ => StartsLikeNumber(error.Token) ? 2 : 5,
    };

    private static bool StartsLikeNumber(JToken? token)
        => token is JValue { Value: string { Length: > 0 } text } && text[0] is (>= '0' and <= '9') or '-' or '+' or '.';
}
