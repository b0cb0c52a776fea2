using Newtonsoft.Json.Linq;
using NJsonSchema;
using NJsonSchema.Validation;

namespace Auditor.Documents;

/// <summary>The wording of all departures from a schema, but those of quantities (<see cref="QuantityProblems"/>).</summary>
internal static class SchemaProblems
{
    /// <summary>Words an error that has been unfolded.</summary>
    public static Problem Word(ValidationError error) => (error, error.Kind) switch
    {
        (QuantityError quantity, _) => quantity.Problem,
        (_, ValidationErrorKind.PropertyRequired) => MissingKey(error),
        (_, ValidationErrorKind.NoAdditionalPropertiesAllowed) => UnknownKey((JProperty)error.Token!, error.Schema),
        (_, ValidationErrorKind.ExcludedSchemaValidates) => Excluded(error),
        _ when error.Token is JValue { Type: JTokenType.Null } => NoValue(error),
        (ChildSchemaValidationError choice, _) => NoChoice(choice),
        (_, ValidationErrorKind.NotInEnumeration) when error.Token is JValue => UnknownWord(error),
        _ when ErrorUnfolding.IsWrongType(error) => WrongType(error),
        (_, ValidationErrorKind.ItemsNotUnique) => RepeatedItem((JArray)error.Token!),
        _ => OutOfBounds(error),
    };

    private static Problem MissingKey(ValidationError error)
    {
        var key = error.Property!;
        return Make("missing-key", $"{SchemaPlaces.NameOf(error.Token!)} lacks `{key}`", error,
            ExpectedValue.ToAdd(key, error.Schema.Properties.TryGetValue(key, out var property) ? property : null));
    }

    private static Problem UnknownKey(JProperty property, JsonSchema schema)
    {
        var allowed = schema.Properties.Keys.Concat(schema.PatternProperties.Keys.Select(pattern => $"any like `{pattern}`")).ToList();
        var suggestion = Suggest(KeySuggestion.For(property, schema), "allowed keys", allowed);
        var isCutOff = property.Value.Type == JTokenType.Null && NodeTokens.NodeOf(property.Value).Span.Length == 0 && property.Previous is not null;
        return Problem.Error("unknown-key", $"{ProblemText.Quote(property.Name)} is not a key of {SchemaPlaces.NameOf(property.Parent!)}", SchemaPlaces.SpanOf(property),
            isCutOff ? $"if it belongs to the value before it, put quotes around that: inside braces a comma ends a value. {Capital(suggestion)}" : suggestion);
    }

    private static Problem UnknownWord(ValidationError error)
    {
        var written = ((ScalarNode)NodeTokens.NodeOf(error.Token!)).Text;
        var words = ExpectedValue.Words(error.Schema);
        var what = error.Schema.Title is { Length: > 0 } title ? WithArticle(ExpectedValue.Sentence(title)) : $"a word for {SchemaPlaces.NameOf(error.Token!)}";
        var help = words.Contains(written, StringComparer.Ordinal)
            ? error.Token!.Type == JTokenType.String ? "write it without quotes" : "put quotes around it"
            : Suggest(NearestWord.Find(written, words), "allowed", words);
        return Make("unknown-word", $"{ProblemText.Quote(written)} is not {what}", error, help);
    }

    private static Problem WrongType(ValidationError error)
        => Make("wrong-type", $"{SchemaPlaces.NameOf(error.Token!)} must be {ExpectedValue.Of(error.Schema)}, not {ExpectedValue.NounOf(error.Token!)}", error,
            ToChangeType(error));

    private static string? ToChangeType(ValidationError error) => (error.Kind, error.Token!.Type) switch
    {
        (ValidationErrorKind.StringExpected, JTokenType.Integer or JTokenType.Float or JTokenType.Boolean) => "put quotes around it",
        (ValidationErrorKind.NumberExpected or ValidationErrorKind.IntegerExpected, JTokenType.String) => "write digits, without quotes or unit",
        (ValidationErrorKind.BooleanExpected, _) => "write `true` or `false`",
        (ValidationErrorKind.ArrayExpected, _) => "write each item on a line of its own that starts with `- `, or all of them as `[one, two]`",
        (ValidationErrorKind.ObjectExpected, _) => "write `key: value` lines below it, indented",
        _ => Describe(error.Schema),
    };

    private static Problem NoValue(ValidationError error) => Make("no-value", $"{SchemaPlaces.NameOf(error.Token!)} has no value", error,
        $"write {ExpectedValue.Of(error.Schema)}, or remove the line");

    private static Problem NoChoice(ChildSchemaValidationError choice)
    {
        var branches = choice.Errors.Select(branch => (Schema: branch.Key.ActualSchema, Errors: branch.Value)).ToList();
        var keys = branches.Select(branch => branch.Schema.RequiredProperties.ToList()).ToList();
        if (choice.Token is not JObject mapping || keys.Exists(required => required.Count == 0))
        {
            return branches.Exists(branch => branch.Errors.Count == 0)
                ? Make("ambiguous", $"{SchemaPlaces.NameOf(choice.Token!)} can be read in more than one way", choice, Describe(choice.Schema))
                : WrongType(choice);
        }

        var sets = string.Join(" or ", keys.Select(Together));
        return branches.Exists(branch => branch.Errors.Count == 0)
            ? SaidTogether(mapping, [.. keys.SelectMany(required => required).Distinct(StringComparer.Ordinal)], $"say only one of: {sets}")
            : Make("missing-key", $"{SchemaPlaces.NameOf(mapping)} lacks {sets}", choice, Describe(choice.Schema) ?? "add one of them");
    }

    private static Problem Excluded(ValidationError error)
    {
        var not = error.Schema.Not!.ActualSchema;
        var sets = not.AnyOf.Select(branch => branch.ActualSchema).Prepend(not).Select(each => each.RequiredProperties).Where(set => set.Count > 0);
        return error.Token is JObject mapping && sets.FirstOrDefault(set => set.All(mapping.ContainsKey)) is { } keys
            ? SaidTogether(mapping, [.. keys], Describe(not) ?? "keep one of them")
            : Make("excluded", $"{SchemaPlaces.NameOf(error.Token!)} cannot be this", error, Describe(not));
    }

    private static Problem SaidTogether(JObject mapping, List<string> keys, string help)
    {
        var said = keys.Where(mapping.ContainsKey).Select(key => ((MappingNode)NodeTokens.NodeOf(mapping)).Entry(key)!.Key)
            .OrderBy(key => key.Span.Start).ToList();
        return said.Count == 1
            ? Problem.Error("excluded-key", $"`{said[0].Value}` cannot be said here", said[0].Span, help)
            : Problem.Error("excluded-key", $"{Together(said.Select(key => key.Value))} cannot be said together", said[^1].Span, help,
                [.. said.SkipLast(1).Select(key => new ProblemLabel(key.Span, "said here"))]);
    }

    private static Problem RepeatedItem(JArray array)
    {
        var seen = new Dictionary<string, JToken>(StringComparer.Ordinal);
        var second = array.First(item => !seen.TryAdd(item.ToString(), item));
        return Problem.Error("repeated-item", $"{SchemaPlaces.NameOf(second)} is said twice", SchemaPlaces.SpanOf(second), "keep one of the two",
            new ProblemLabel(SchemaPlaces.SpanOf(seen[second.ToString()]), "first said here"));
    }

    private static Problem OutOfBounds(ValidationError error)
    {
        var (name, schema) = (SchemaPlaces.NameOf(error.Token!), error.Schema);
        var (code, message) = error.Kind switch
        {
            ValidationErrorKind.PatternMismatch => ("wrong-form", $"{name} does not have the form that is due"),
            ValidationErrorKind.StringTooShort => ("wrong-form", $"{name} must have at least {Count(schema.MinLength, "character")}"),
            ValidationErrorKind.StringTooLong => ("wrong-form", $"{name} must have at most {Count(schema.MaxLength, "character")}"),
            ValidationErrorKind.DateExpected => ("wrong-form", $"{name} must be a date such as `2026-09-14`"),
            ValidationErrorKind.NumberTooSmall => ("out-of-range", $"{name} must be {LeastOf(schema)}"),
            ValidationErrorKind.NumberTooBig => ("out-of-range", $"{name} must be {MostOf(schema)}"),
            ValidationErrorKind.NumberNotMultipleOf or ValidationErrorKind.IntegerNotMultipleOf => ("out-of-range", $"{name} must be a multiple of {schema.MultipleOf}"),
            ValidationErrorKind.TooFewItems => ("too-few", $"{name} must have at least {Count(schema.MinItems, "item")}"),
            ValidationErrorKind.TooManyItems => ("too-many", $"{name} must have at most {Count(schema.MaxItems, "item")}"),
            ValidationErrorKind.TooFewProperties => ("too-few", $"{name} must have at least {Count(schema.MinProperties, "key")}"),
            ValidationErrorKind.TooManyProperties => ("too-many", $"{name} must have at most {Count(schema.MaxProperties, "key")}"),
            _ => ("wrong-form", $"{name} does not fit the schema"),
        };
        return Make(code, message, error, error.Kind == ValidationErrorKind.PatternMismatch ? ToMatch(schema) : Describe(schema));
    }

    private static string LeastOf(JsonSchema schema) => schema.ExclusiveMinimum is { } above ? $"more than {above}" : $"at least {schema.Minimum}";

    private static string MostOf(JsonSchema schema) => schema.ExclusiveMaximum is { } below ? $"less than {below}" : $"at most {schema.Maximum}";

    private static string ToMatch(JsonSchema schema)
        => schema.ExtensionData is { } keywords && keywords.TryGetValue("patternErrorMessage", out var message) && message is string text
            ? text
            : Describe(schema) ?? $"it must match the regular expression `{schema.Pattern}`";

    private static string Suggest(string? nearest, string label, IReadOnlyList<string> allowed)
    {
        var list = allowed.Count == 0 ? "no key can be said here" : $"{label}: {ExpectedValue.List(allowed)}";
        return nearest is null ? list : $"did you mean `{nearest}`? {Capital(list)}";
    }

    private static string? Describe(JsonSchema schema) => schema.Description is { Length: > 0 } description ? ExpectedValue.Sentence(description) : null;

    private static string Together(IEnumerable<string> keys) => string.Join(" and ", keys.Select(key => $"`{key}`"));

    private static string Count(int? count, string noun) => count == 1 ? $"1 {noun}" : $"{count} {noun}s";

    private static string Capital(string text) => char.ToUpperInvariant(text[0]) + text[1..];

    private static string WithArticle(string noun) => $"{("aeiou".Contains(char.ToLowerInvariant(noun[0])) ? "an" : "a")} {noun}";

    private static Problem Make(string code, string message, ValidationError error, string? help)
        => Problem.Error(code, message, SchemaPlaces.SpanOf(error.Token!), help);
}
