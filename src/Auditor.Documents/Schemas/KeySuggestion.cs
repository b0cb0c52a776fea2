using Newtonsoft.Json.Linq;
using NJsonSchema;

namespace Auditor.Documents;

/// <summary>The key that was probably meant by one that a schema does not know.</summary>
internal static class KeySuggestion
{
    /// <summary>Returns the nearest key that the schema knows and the mapping does not say yet; null when none is near.</summary>
    public static string? For(JProperty unknown, JsonSchema schema)
        => NearestWord.Find(unknown.Name, schema.Properties.Keys.Where(key => !((JObject)unknown.Parent!).ContainsKey(key)));
}
