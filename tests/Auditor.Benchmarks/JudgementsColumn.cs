using System.Globalization;
using BenchmarkDotNet.Columns;
using BenchmarkDotNet.Reports;
using BenchmarkDotNet.Running;

namespace Auditor.Benchmarks;

/// <summary>
/// Decisions of a rule on a subject in a second, where a benchmark takes all of a design; by the quickest run, which other work on the
/// machine disturbs least.
/// </summary>
internal sealed class JudgementsColumn : IColumn
{
    public string Id => nameof(JudgementsColumn);

    public string ColumnName => "Judgements/s";

    public string Legend => "Decisions of one rule on one subject in a second, quantities computed on the way";

    public bool AlwaysShow => true;

    public ColumnCategory Category => ColumnCategory.Custom;

    public int PriorityInCategory => 0;

    public bool IsNumeric => true;

    public UnitType UnitType => UnitType.Dimensionless;

    public string GetValue(Summary summary, BenchmarkCase benchmarkCase)
    {
        if (benchmarkCase.Descriptor.Type != typeof(AuditBenchmarks) || summary[benchmarkCase]?.ResultStatistics is not { } statistics)
        {
            return "-";
        }

        var perRun = Inputs.Judgements((string)benchmarkCase.Parameters[nameof(AuditBenchmarks.Design)]);
        return (perRun / (statistics.Min / 1e9)).ToString("N0", CultureInfo.InvariantCulture);
    }

    public string GetValue(Summary summary, BenchmarkCase benchmarkCase, SummaryStyle style) => GetValue(summary, benchmarkCase);

    public bool IsDefault(Summary summary, BenchmarkCase benchmarkCase) => false;

    public bool IsAvailable(Summary summary) => true;
}
