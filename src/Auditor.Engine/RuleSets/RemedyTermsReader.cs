using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads how an adjustment may serve as a remedy.</summary>
/// <param name="ladders">Reads values of inputs.</param>
internal sealed class RemedyTermsReader(LadderReader ladders)
{
    private const int UsualMost = 3;

    private const double UsualShare = 0.5;

    /// <summary>The terms; null with problems added when a value has not the type of the input.</summary>
    public RemedyTerms? Read(MappingNode node, InputSlot slot)
    {
        var round = 0.0;
        if (node.Scalar("round") is { } text)
        {
            if (ladders.Step(text, slot) is not { } value)
            {
                return null;
            }

            round = value.Number;
        }

        var way = node.Text("way") switch
        {
            "up" => RemedyWay.Up,
            "down" => RemedyWay.Down,
            _ => RemedyWay.Either,
        };
        var share = node.Scalar("share") is { } part ? ParameterReader.Literal(part).Value.Number : UsualShare;
        return new RemedyTerms(
            (int)node.Scalar("effort")!.Number, way, node.Scalar("most") is { } most ? (int)most.Number : UsualMost, share, round,
            node.Scalar("adds") is { Flag: true });
    }
}
