namespace Auditor.Documents.Tests;

public class SchemaTests
{
    private static Problems Check(string schema, string yaml)
    {
        var node = Yaml.Read(yaml, out var problems);
        Schema.Parse(new SourceText("test.schema.json", schema)).Validate(node!, problems);
        return problems;
    }

    [Theory]
    [InlineData("""{ "properties": { "a": { "const": 1 } } }""", "test.schema.json: properties.a: the keyword `const` is not supported")]
    [InlineData("""{ "if": {}, "then": {} }""", "test.schema.json: $: the keyword `if` is not supported")]
    [InlineData("""{ "definitions": { "x": { "oneOf": [{ "propertyNames": {} }] } } }""", "test.schema.json: definitions.x.oneOf[0]: the keyword `propertyNames` is not supported")]
    [InlineData("""{ "items": { "dependencies": {} } }""", "test.schema.json: items: the keyword `dependencies` is not supported")]
    [InlineData("""{ "items": [{}] }""", "test.schema.json: $: `items` takes one schema for all items")]
    [InlineData("""{ "not": { "contains": {} } }""", "test.schema.json: not: the keyword `contains` is not supported")]
    [InlineData("""{ "additionalProperties": { "format": "email" } }""", "test.schema.json: additionalProperties: `format` knows `date` only")]
    [InlineData("""{ "enum": [[1]] }""", "test.schema.json: $: `enum` lists single values only")]
    [InlineData("""{ "$ref": "other.json#/x" }""", "test.schema.json: $: `$ref` refers to the same file only")]
    [InlineData("""{ "quantity": "colour" }""", "`colour` is not a kind of quantity; there are length, area,")]
    [InlineData("""{ "quantity": "length", "at-most": "10 A" }""", "`at-most` takes a length as text, such as \"25 m\"")]
    [InlineData("""{ "quantity": "length", "at-least": 10 }""", "`at-least` takes a length as text")]
    [InlineData("""{ "quantity": "length", "signed": "yes" }""", "`signed` takes `true` or `false`")]
    [InlineData("""{ "type": """, "test.schema.json:1:11: the text is not JSON")]
    [InlineData("""{ "$ref": "#/definitions/nowhere" }""", "test.schema.json: ")]
    public void A_schema_that_cannot_be_held_to_is_refused(string schema, string message)
        => Assert.Contains(message, Assert.Throws<InvalidDataException>(() => Schema.Parse(new SourceText("test.schema.json", schema))).Message, StringComparison.Ordinal);

    [Fact]
    public void A_property_may_bear_the_name_of_a_keyword()
        => Assert.Empty(Check("""{ "properties": { "const": { "type": "string" }, "if": { "type": "integer" } } }""", "const: a\nif: 1\n").All);

    [Theory]
    [InlineData("""{ "oneOf": [{ "type": "string" }, { "enum": ["b"] }] }""", "a: b", "`a` can be read in more than one way")]
    [InlineData("""{ "not": { "type": "string" } }""", "a: b", "`a` cannot be this")]
    [InlineData("""{ "not": { "required": ["b"] } }""", "a: { b: 1 }", "`b` cannot be said here")]
    [InlineData("""{ "not": { "anyOf": [{ "required": ["x"] }, { "required": ["c", "b"] }] } }""", "a: { b: 1, c: 2 }", "`b` and `c` cannot be said together")]
    [InlineData("""{ "anyOf": [{ "required": ["x", "y"] }, { "required": ["z"] }] }""", "a: { x: 1 }", "`a` lacks `x` and `y` or `z`")]
    [InlineData("""{ "type": "array", "maxItems": 1 }""", "a: [1, 2]", "`a` must have at most 1 item")]
    [InlineData("""{ "items": { "items": { "type": "integer" } } }""", "a: [[b]]", "an item must be a whole number, not a text")]
    [InlineData("""{ "allOf": [{ "minimum": 3 }, { "maximum": 1 }] }""", "a: 2", "`a` must be at least 3", "`a` must be at most 1")]
    [InlineData("""{ "type": "null" }""", "a: 1", "`a` must be nothing, not a number")]
    [InlineData("""{ "type": ["array", "boolean"] }""", "a: b", "`a` must be a list or `true` or `false`, not a text")]
    [InlineData("""{ "enum": ["1", null] }""", "a: 1", "`1` is not a word for `a`")]
    [InlineData("""{ "properties": {}, "additionalProperties": false }""", "a: { b: 1 }", "`b` is not a key of `a`")]
    public void A_departure_is_put_in_our_words(string schema, string yaml, params string[] messages)
        => Assert.Equal(messages, Check($$"""{ "properties": { "a": {{schema}} } }""", yaml).All.Select(problem => problem.Message));

    [Theory]
    [InlineData("\"signed\": true", "-1 m", true)]
    [InlineData("\"signed\": true", "0 m", true)]
    [InlineData("\"may-be-zero\": true", "0 m", true)]
    [InlineData("\"may-be-zero\": true", "-1 m", false)]
    [InlineData("\"signed\": false", "0 m", false)]
    [InlineData("\"at-most\": \"2 m\"", "2000 mm", true)]
    [InlineData("\"at-most\": \"2 m\"", "2000.1 mm", false)]
    [InlineData("\"at-most\": \"0.3 m\"", "30 cm", true)]
    [InlineData("\"at-least\": \"2 m\"", "0.002 km", true)]
    [InlineData("\"at-least\": \"2 m\"", "1.9 m", false)]
    [InlineData("\"signed\": true, \"at-least\": \"-2 m\"", "-2 m", true)]
    [InlineData("\"signed\": true, \"at-least\": \"-2 m\"", "-2.1 m", false)]
    public void A_quantity_is_held_to_its_limits(string keywords, string value, bool isGood)
    {
        var problems = Check($$"""{ "properties": { "a": { "type": "string", "quantity": "length", {{keywords}} } } }""", "a: " + value);

        Assert.Equal(isGood ? [] : ["out-of-range"], problems.Codes());
    }

    [Theory]
    [InlineData("0.8")]
    [InlineData("80 %")]
    [InlineData("\"0.8 ± 5 %\"")]
    [InlineData("\"80 %, assumed\"")]
    public void A_ratio_is_a_number_alone_or_in_per_cent(string value)
        => Assert.Empty(Check("""{ "properties": { "a": { "type": ["string", "number"], "quantity": "ratio" } } }""", "a: " + value).All);

    [Theory]
    [InlineData("B", true)]
    [InlineData("\"B\\n\"", false)]
    [InlineData("\"B\\n\\n\"", false)]
    public void A_form_ends_where_the_text_ends(string value, bool isGood)
        => Assert.Equal(isGood ? [] : ["wrong-form"], Check("""{ "properties": { "a": { "type": "string", "pattern": "^[A-Z]$" } } }""", "a: " + value).Codes());

    [Fact]
    public void What_a_partial_mapping_lacks_is_not_reported()
    {
        const string Schema = """
            { "required": ["a", "b"], "minProperties": 2, "oneOf": [{ "required": ["a"] }, { "required": ["c"] }],
              "not": { "required": ["x", "y"] }, "properties": { "l": { "type": "array", "minItems": 2 } } }
            """;

        Assert.Equal(["alias", "alias"], Check(Schema, "q: *x\nl: [*x]\n").Codes());
    }

    [Fact]
    public void A_schema_may_be_used_from_several_threads()
    {
        var texts = Enumerable.Range(0, 50).Select(i => $"plan-format: 1\nruns: [{{ id: r{i}, length: {i} }}]").ToList();
        var alone = texts.ConvertAll(Show);

        Assert.Equal(alone, texts.AsParallel().AsOrdered().Select(Show).ToList());

        static string Show(string text)
        {
            var node = Yaml.Read(text, out var problems);
            Plan.Schema.Validate(node!, problems);
            return ProblemText.Render(problems.All);
        }
    }

    // Looking up the path of each item would take the square of this length in steps.
    [Fact]
    public void A_very_long_list_with_alternatives_comes_to_an_end()
    {
        var list = "[" + string.Concat(Enumerable.Repeat("1 m, ", 300_000)) + "x]";
        var problems = Check("""{ "items": { "oneOf": [{ "type": "string", "quantity": "length" }, { "type": "object" }] } }""", list);

        Assert.Equal(["unreadable-quantity"], problems.Codes());
    }

    [Fact]
    public void A_large_mapping_where_a_word_is_due_is_not_written_out_for_each_word()
    {
        var words = string.Join(", ", Enumerable.Range(0, 1_000).Select(i => $"\"w{i}\""));
        var mapping = "a: {" + string.Concat(Enumerable.Range(0, 100_000).Select(i => $"k{i}: 1, ")) + "}";

        Assert.Equal(["wrong-type"], Check($$"""{ "properties": { "a": { "enum": [{{words}}] } } }""", mapping).Codes());
    }
}
