using Auditor.Documents;
using Auditor.Engine.Evaluation;

namespace Auditor.Engine.Installation;

/// <summary>
/// Makes the tree of subjects from a design file and checks what a schema cannot say. A file that the schema refuses gets its tree
/// checked as well, so that all problems are told in one run; what has not the right form there is passed over.
/// </summary>
public sealed class DesignBuilder
{
    private const string InstallationKey = "-";
    private const string BondingPrefix = "bonding";

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
            if (node.Scalar("id") is not { } id)
            {
                continue;
            }

            if (id.Text is InstallationKey or BondingPrefix)
            {
                _problems.Add(DesignMessages.ReservedId(id.Span, id.Text));
            }

            var board = MakeBoard(node, id.Text);
            if (IsFirst(id, "boards", ids))
            {
                _boards.Add(board);
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
            if (circuitNode.Scalar("id") is { } circuitId)
            {
                IsFirst(circuitId, $"circuits on board `{id}` called", ids);
                circuits.Add(MakeCircuit(circuitNode, board, $"{id}/{circuitId.Text}"));
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
            if (node.Scalar("to") is { } name)
            {
                IsFirst(name, "bonding conductors to", names);
                var bonding = Subject(_shapes.Bonding, $"{BondingPrefix}/{name.Text}", node);
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

    /// <summary>Whether an id is new; a problem otherwise. What bears it is made all the same, so that nothing else is told to be missing.</summary>
    private bool IsFirst(ScalarNode id, string what, Dictionary<string, SourceSpan> seen)
    {
        var isFirst = seen.TryAdd(id.Text, id.Span);
        if (!isFirst)
        {
            _problems.Add(DesignMessages.SecondId(id.Span, what, id.Text, seen[id.Text]));
        }

        return isFirst;
    }
}
