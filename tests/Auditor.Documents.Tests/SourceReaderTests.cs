namespace Auditor.Documents.Tests;

public sealed class SourceReaderTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();
    private readonly Problems _problems = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void A_file_is_read_without_its_byte_order_mark()
    {
        var source = SourceReader.Read(_folder.Write("a.yaml", [0xEF, 0xBB, 0xBF, 0x61, 0xC2, 0xB2, 0x0D, 0x0A]), "shown/a.yaml", _problems);

        Assert.Equal("a²\r\n", source!.Text);
        Assert.Equal("shown/a.yaml", source.Path);
        Assert.Empty(_problems.All);
    }

    [Fact]
    public void A_missing_file_is_a_problem()
    {
        Assert.Null(SourceReader.Read(Path.Combine(_folder.Path, "nowhere", "a.yaml"), "a.yaml", _problems));
        Assert.Equal(["file-missing"], _problems.Codes());
    }

    [Fact]
    public void A_file_behind_links_is_read_whole()
    {
        _folder.Write("there/a.yaml", "far more than the few letters of the links");
        _folder.Link("b", "there/a.yaml");
        _folder.Link("c", "b");

        Assert.Equal("far more than the few letters of the links", SourceReader.Read(Path.Combine(_folder.Path, "c"), "c", _problems)!.Text);
        Assert.Empty(_problems.All);
    }

    [Fact]
    public void Links_that_go_round_or_lead_nowhere_are_a_problem()
    {
        _folder.Link("a", "b");
        _folder.Link("b", "a");
        _folder.Link("c", "nowhere");

        Assert.Null(SourceReader.Read(Path.Combine(_folder.Path, "a"), "a", _problems));
        Assert.Null(SourceReader.Read(Path.Combine(_folder.Path, "c"), "c", _problems));
        Assert.Equal(["file-unreadable", "file-missing"], _problems.Codes());
    }

    [Fact]
    public void A_folder_is_a_problem()
    {
        Assert.Null(SourceReader.Read(_folder.Path, "plans", _problems));
        Assert.Equal(["file-is-folder"], _problems.Codes());
    }

    [Fact]
    public void A_path_that_no_system_takes_is_a_problem()
    {
        Assert.Null(SourceReader.Read(Path.Combine(_folder.Path, "a\0b"), "a", _problems));
        Assert.Null(SourceReader.Read(Path.Combine(_folder.Path, new string('a', 5000)), "b", _problems));
        Assert.Equal(2, _problems.All.Count);
    }

    [Theory]
    [InlineData(9, false)]
    [InlineData(10, true)]
    [InlineData(11, true)]
    public void A_file_may_be_as_large_as_the_limit(long limit, bool isRead)
    {
        var source = SourceReader.Read(_folder.Write("a.yaml", "0123456789"), "a.yaml", _problems, ReadingLimits.Default with { Bytes = limit });

        Assert.Equal(isRead, source is not null);
        Assert.Equal(isRead ? [] : ["too-large"], _problems.Codes());
    }

    [Fact]
    public void The_limit_is_64_MiB() => Assert.Equal(67_108_864, ReadingLimits.Default.Bytes);

    [Fact]
    public void A_device_without_end_is_not_read()
    {
        Assert.SkipUnless(OperatingSystem.IsLinux(), "there are no such devices");

        Assert.Equal("", SourceReader.Read("/dev/zero", "zero", _problems)!.Text);
    }

    [Theory]
    [InlineData(new byte[] { 0x61, 0x80 }, "not-utf-8")]
    [InlineData(new byte[] { 0xC2 }, "not-utf-8")]
    [InlineData(new byte[] { 0xED, 0xA0, 0x80 }, "not-utf-8")]
    [InlineData(new byte[] { 0xC0, 0x80 }, "not-utf-8")]
    [InlineData(new byte[] { 0xFE, 0xFF, 0x00, 0x61 }, "not-utf-8")]
    [InlineData(new byte[] { 0x61, 0x00 }, "forbidden-character")]
    [InlineData(new byte[] { 0x1B, 0x5B, 0x32, 0x4A }, "forbidden-character")]
    [InlineData(new byte[] { 0x61, 0x7F }, "forbidden-character")]
    [InlineData(new byte[] { 0x61, 0xEF, 0xBB, 0xBF }, "forbidden-character")]
    public void Bytes_that_are_no_text_are_a_problem(byte[] bytes, string code)
    {
        Assert.Null(SourceReader.Read(_folder.Write("a.yaml", bytes), "a.yaml", _problems));
        Assert.Equal([code], _problems.Codes());
    }

    [Fact]
    public void The_first_byte_that_is_not_utf_8_is_marked()
    {
        SourceReader.Read(_folder.Write("a.yaml", [0xC2, 0xB2, 0x0A, 0x61, 0xE4, 0x62]), "a.yaml", _problems);

        Assert.Equal(new Location(2, 2), _problems.All[0].Span!.Value.StartLocation);
    }
}
