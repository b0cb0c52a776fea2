using Auditor.Documents;
using Auditor.Engine.Evaluation;

namespace Auditor.Engine.Installation;

/// <summary>
/// Makes the tree of subjects from a design file and checks what a schema cannot say. A file that the schema refuses gets its tree
/// checked as well, so that all problems are told in one run; what has not the right form there is passed over.
/// </summary>
public sealed class DesignBuilder
{
    private readonly Design _design;
    private readonly Shapes _shapes;
    private readonly Problems _problems;
    private readonly List<DesignSubject> _subjects = [];
    private readonly List<DesignSubject> _boards = [];
    private readonly List<DesignSubject> _circuits = [];

    private DesignBuilder(DesignFile file, Evaluator evaluator, Problems problems)
    {
        _shapes = evaluator.Rules.Schema.Shapes;
        _design = new Design(file, evaluator);
        _problems = problems;
    }

    /// <summary>Makes the design; null, with problems added, when the tree does not hold together.</summary>
    public static Design? Build(DesignFile file, Evaluator evaluator, Problems problems)
    {
        var builder = new DesignBuilder(file, evaluator, problems);
        builder.Make();
        TypeNames.Check(file.Root, builder._subjects, problems);
        var sound = SupplyTree.Link(builder._boards, builder._circuits, problems);
        return sound && !problems.HasErrors ? builder._design : null;
    }

    private void Make()
    {
        var installation = _design.Installation;
        _subjects.Add(installation);
        var bondings = Bondings(installation);
        var ids = new Dictionary<string, SourceSpan>();
        foreach (var node in installation.Node.Mappings("boards"))
        {
            if (Id(node, "id", "boards", ids) is { } id)
            {
                _boards.Add(MakeBoard(node, id));
            }
        }

        installation.Collections.Add(_boards);
        installation.Collections.Add(_circuits);
        installation.Collections.Add(bondings);
        _design.Subjects = _subjects;
    }

    private DesignSubject MakeBoard(MappingNode node, string id)
    {
        var board = Subject(_shapes.Board, id, node);
        board.Parent = null;
        var circuits = new List<DesignSubject>();
        var ids = new Dictionary<string, SourceSpan>();
        foreach (var circuitNode in node.Mappings("circuits"))
        {
            if (Id(circuitNode, "id", $"circuits on board `{id}` called", ids) is { } circuitId)
            {
                circuits.Add(MakeCircuit(circuitNode, board, $"{id}/{circuitId}"));
            }
        }

        board.Collections.Add(circuits);
        _circuits.AddRange(circuits);
        return board;
    }

    private DesignSubject MakeCircuit(MappingNode node, DesignSubject board, string key)
    {
        var circuit = Subject(_shapes.Circuit, key, node);
        circuit.Parent = board;
        if (node.Entry("cable") is { } cable && node.Entry("legs") is { } legs)
        {
            _problems.Add(DesignMessages.CableAndLegs(cable.Key.Span, legs.Key.Span));
        }

        var runs = new List<DesignSubject>();
        foreach (var run in node.Mappings("cable").Concat(node.Mappings("legs")))
        {
            var leg = Subject(_shapes.Leg, $"{key}/leg {runs.Count + 1}", run);
            leg.Parent = circuit;
            runs.Add(leg);
        }

        circuit.Collections.Add(runs);
        return circuit;
    }

    private List<DesignSubject> Bondings(DesignSubject installation)
    {
        var bondings = new List<DesignSubject>();
        var names = new Dictionary<string, SourceSpan>();
        foreach (var node in installation.Node.Mapping("earthing")?.Mappings("bonding") ?? [])
        {
            if (Id(node, "to", "bonding conductors to", names) is { } name)
            {
                var bonding = Subject(_shapes.Bonding, "bonding/" + name, node);
                bonding.Parent = installation;
                bondings.Add(bonding);
            }
        }

        return bondings;
    }

    private DesignSubject Subject(Formulas.Subjects.SubjectShape shape, string key, MappingNode node)
    {
        var subject = new DesignSubject(_design, shape, key, node, _design.Evaluator) { Index = _subjects.Count };
        _subjects.Add(subject);
        return subject;
    }

    private string? Id(MappingNode node, string key, string what, Dictionary<string, SourceSpan> seen)
    {
        if (node.Scalar(key) is not { } scalar)
        {
            return null;
        }

        if (seen.TryAdd(scalar.Text, scalar.Span))
        {
            return scalar.Text;
        }

        _problems.Add(DesignMessages.SecondId(scalar.Span, what, scalar.Text, seen[scalar.Text]));
        return null;
    }
}
