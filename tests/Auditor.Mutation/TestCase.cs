using System.Collections;
using System.Reflection;

namespace Auditor.Mutation;

/// <summary>One test with its data, found by its attributes and run without a framework.</summary>
/// <param name="Name">Class, method and number of the row of data.</param>
/// <param name="Method">The method.</param>
/// <param name="Arguments">What it is called with.</param>
internal sealed record TestCase(string Name, MethodInfo Method, object?[] Arguments)
{
    private const BindingFlags Static = BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.FlattenHierarchy;

    /// <summary>The tests of an assembly, in the order of their names.</summary>
    /// <param name="assembly">The assembly.</param>
    /// <param name="classes">The classes whose tests are wanted; none for all.</param>
    public static IReadOnlyList<TestCase> In(Assembly assembly, string[] classes) =>
        [.. assembly.GetTypes().Where(type => type is { IsAbstract: false, IsGenericTypeDefinition: false } && (classes.Length == 0 || classes.Contains(type.Name)))
            .SelectMany(type => type.GetMethods(BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public))
            .Where(method => Attributes(method, "FactAttribute", "TheoryAttribute").Any())
            .SelectMany(method => Rows(method).Select((row, number) => new TestCase($"{method.DeclaringType!.Name}.{method.Name} {number}", method, Fitted(method, row))))
            .OrderBy(test => test.Name, StringComparer.Ordinal)];

    /// <summary>Runs it; what it threw, or null.</summary>
    public Exception? Run()
    {
        object? instance = null;
        try
        {
            instance = Method.IsStatic ? null : Activator.CreateInstance(Method.DeclaringType!);
            (Method.Invoke(instance, Arguments) as Task)?.GetAwaiter().GetResult();
            return null;
        }
        catch (Exception thrown)
        {
            return thrown;
        }
        finally
        {
            (instance as IDisposable)?.Dispose();
        }
    }

    private static IEnumerable<object?[]> Rows(MethodInfo method)
    {
        if (Attributes(method, "FactAttribute").Any())
        {
            return [[]];
        }

        return Attributes(method, "InlineDataAttribute", "MemberDataAttribute").SelectMany(source => source.GetType().GetProperty("Data") is { } inline
            ? [(object?[])inline.GetValue(source)!]
            : ((IEnumerable)Member(method.DeclaringType!, (string)source.GetType().GetProperty("MemberName")!.GetValue(source)!)).Cast<object>().Select(Row));
    }

    private static object Member(Type type, string name) =>
        type.GetProperty(name, Static)?.GetValue(null) ?? type.GetField(name, Static)?.GetValue(null) ?? type.GetMethod(name, Static)!.Invoke(null, null)!;

    private static object?[] Row(object item) =>
        item as object?[] ?? (object?[])item.GetType().GetInterfaces().Single(type => type.Name == "ITheoryDataRow").GetMethod("GetData")!.Invoke(item, null)!;

    /// <summary>Gathers what goes into a last parameter of any number of items, and puts in what has a default.</summary>
    private static object?[] Fitted(MethodInfo method, object?[] row)
    {
        var parameters = method.GetParameters();
        var isOpen = parameters is [.., var last] && last.IsDefined(typeof(ParamArrayAttribute)) && !(row.Length == parameters.Length && last.ParameterType.IsInstanceOfType(row[^1]));
        if (isOpen)
        {
            var rest = Array.CreateInstance(parameters[^1].ParameterType.GetElementType()!, row.Length - parameters.Length + 1);
            Array.Copy(row, parameters.Length - 1, rest, 0, rest.Length);
            row = [.. row[..(parameters.Length - 1)], rest];
        }

        return [.. row, .. parameters.Skip(row.Length).Select(parameter => parameter.DefaultValue)];
    }

    private static IEnumerable<Attribute> Attributes(MethodInfo method, params string[] names) =>
        method.GetCustomAttributes().Where(attribute => names.Contains(attribute.GetType().Name));
}
