namespace Auditor.Documents.Tests;

public sealed class DocumentLoaderTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();
    private readonly Problems _problems = new();

    public void Dispose() => _folder.Dispose();

    private Document? Load(ReadingLimits? limits = null, string top = "plans/top.yaml")
        => DocumentLoader.Load(Path.Combine(_folder.Path, top), "shown/" + top, _problems, limits);

    [Fact]
    public void Included_keys_stand_in_the_place_of_the_include()
    {
        _folder.Write("plans/top.yaml", "a: 1\ninclude: parts/b.yaml\nc: 3\n");
        _folder.Write("plans/parts/b.yaml", "b: { include: deep/d.yaml }\n");
        _folder.Write("plans/parts/deep/d.yaml", "d: 4\ninclude: ../e.yaml\n");
        _folder.Write("plans/parts/e.yaml", "e: 5\n");

        var root = Assert.IsType<MappingNode>(Load()!.Root);

        Assert.Empty(_problems.All);
        Assert.Equal(["a", "b", "c"], root.Entries.Select(entry => entry.Key.Value));
        var inner = Assert.IsType<MappingNode>(root.Find("b"));
        Assert.Equal(["d", "e"], inner.Entries.Select(entry => entry.Key.Value));
        Assert.Equal("shown/plans/parts/e.yaml", inner.Find("e")!.Span.Source.Path);
    }

    // The digests are by sha256sum of GNU coreutils.
    [Fact]
    public void Inputs_are_sorted_by_path_each_once_with_the_digest_of_its_bytes()
    {
        _folder.Write("plans/top.yaml", "x: [{ include: b.yaml }, { include: a.yaml }, { include: b.yaml }]\n");
        _folder.Write("plans/b.yaml", [0xEF, 0xBB, 0xBF, .. "b: 1\n"u8]);
        _folder.Write("plans/a.yaml", "a: 1\n");

        var inputs = Load()!.Inputs;

        Assert.Equal(["shown/plans/a.yaml", "shown/plans/b.yaml", "shown/plans/top.yaml"], inputs.Select(input => input.Path));
        Assert.Equal("37b128c59f1f5097f73f82691cb519f1f568667faab5ced1b4ab979d36837eae", inputs[0].Sha256);
        Assert.Equal("61f1ee8533f5de1bce5304a8daf025b4e3bd05859d252a5baea3a69b55ebd432", inputs[1].Sha256);
    }

    [Fact]
    public void A_link_that_leads_out_of_the_folder_is_refused()
    {
        _folder.Write("outside/secret.yaml", "secret: 1\n");
        _folder.Write("plans/top.yaml", "a: { include: link.yaml }\nb: { include: linked/secret.yaml }\nc: { include: chain.yaml }\n");
        _folder.Link("plans/link.yaml", "../outside/secret.yaml");
        _folder.Link("plans/linked", Path.Combine(_folder.Path, "outside"));
        _folder.Link("plans/chain.yaml", "link.yaml");

        var document = Load();

        Assert.Equal(["include-outside", "include-outside", "include-outside"], _problems.Codes());
        Assert.DoesNotContain(document!.Inputs, input => input.Path.Contains("secret", StringComparison.Ordinal));
    }

    [Fact]
    public void A_link_inside_the_folder_is_followed()
    {
        _folder.Write("plans/parts/a.yaml", "a: 1\n");
        _folder.Write("plans/top.yaml", "include: link.yaml\n");
        _folder.Link("plans/link.yaml", "parts/../parts/a.yaml");

        Assert.NotNull(Assert.IsType<MappingNode>(Load()!.Root).Find("a"));
        Assert.Empty(_problems.All);
    }

    [Fact]
    public void The_folder_of_the_top_file_is_that_of_the_file_itself_not_of_a_link_to_it()
    {
        _folder.Write("plans/top.yaml", "include: a.yaml\n");
        _folder.Write("plans/a.yaml", "a: 1\n");
        _folder.Link("desk/plan.yaml", "../plans/top.yaml");
        _folder.Link("all", "plans");

        Assert.NotNull(Load(top: "desk/plan.yaml"));
        Assert.NotNull(Load(top: "all/top.yaml"));
        Assert.Empty(_problems.All);
    }

    [Fact]
    public void Links_that_go_round_are_a_missing_file()
    {
        _folder.Write("plans/top.yaml", "include: one.yaml\n");
        _folder.Link("plans/one.yaml", "two.yaml");
        _folder.Link("plans/two.yaml", "one.yaml");

        Load();

        Assert.Equal(["include-missing"], _problems.Codes());
    }

    [Fact]
    public void A_link_does_not_hide_that_a_file_includes_itself()
    {
        _folder.Write("plans/top.yaml", "a: { include: again.yaml }\n");
        _folder.Link("plans/again.yaml", "top.yaml");

        Load();

        Assert.Equal(["include-loop"], _problems.Codes());
    }

    [Theory]
    [InlineData("a: { include: \"a\\u0007.yaml\" }")]
    [InlineData("a: { include: { path: a.yaml } }")]
    [InlineData("a: { include: ~ }")]
    public void An_include_that_is_no_path_is_a_problem(string text)
    {
        _folder.Write("plans/top.yaml", text);

        Load();

        Assert.Contains("include-path", _problems.Codes());
    }

    [Theory]
    [InlineData(4, new string[0])]
    [InlineData(3, new[] { "too-many-files" })]
    public void A_file_included_twice_counts_twice(int files, string[] codes)
    {
        _folder.Write("plans/top.yaml", "x: [{ include: a.yaml }, { include: a.yaml }, { include: a.yaml }]\n");
        _folder.Write("plans/a.yaml", "a: 1\n");

        Load(ReadingLimits.Default with { Files = files });

        Assert.Equal(codes, _problems.Codes());
    }

    [Fact]
    public void Inclusions_that_multiply_come_to_an_end()
    {
        _folder.Write("plans/top.yaml", Ten("1"));
        for (var i = 1; i <= 7; i++)
        {
            _folder.Write($"plans/{i}.yaml", Ten($"{i + 1}"));
        }

        _folder.Write("plans/8.yaml", "a: 1\n");

        Load();

        Assert.Equal(["too-many-files"], _problems.Codes().Distinct().Order(StringComparer.Ordinal));

        static string Ten(string file) => "x: [" + string.Concat(Enumerable.Repeat($"{{ include: {file}.yaml }}, ", 10)) + "]\n";
    }

    [Theory]
    [InlineData(54, true)]
    [InlineData(53, false)]
    public void The_sizes_of_included_files_add_up(long bytes, bool isRead)
    {
        _folder.Write("plans/top.yaml", "x: [{ include: a.yaml }, { include: a.yaml }]\n");
        _folder.Write("plans/a.yaml", "a: 1");

        Load(ReadingLimits.Default with { Bytes = bytes });

        Assert.Equal(isRead ? [] : ["too-large"], _problems.Codes());
    }

    [Theory]
    [InlineData(6, true)]
    [InlineData(5, false)]
    public void The_keys_and_values_of_included_files_add_up(int values, bool isRead)
    {
        _folder.Write("plans/top.yaml", "include: a.yaml\n");
        _folder.Write("plans/a.yaml", "a: 1\n");

        Load(ReadingLimits.Default with { Values = values });

        Assert.Equal(isRead ? [] : ["too-large"], _problems.Codes());
    }

    [Theory]
    [InlineData(4, true)]
    [InlineData(3, false)]
    public void Nesting_adds_up_over_included_files(int nesting, bool isRead)
    {
        _folder.Write("plans/top.yaml", "a: [ { include: a.yaml } ]\n");
        _folder.Write("plans/a.yaml", "b: [ 1 ]\n");

        Load(ReadingLimits.Default with { Nesting = nesting });

        Assert.Equal(isRead ? [] : ["too-deep"], _problems.Codes());
    }

    [Fact]
    public void A_mapping_whose_include_failed_is_partial()
    {
        _folder.Write("plans/top.yaml", "a: { b: 1, include: nowhere.yaml }\n");

        var root = Assert.IsType<MappingNode>(Load()!.Root);

        Assert.True(root.Find("a")!.IsPartial);
        Assert.Equal(["include-missing"], _problems.Codes());
    }

    [Fact]
    public void No_path_of_the_machine_is_shown()
    {
        _folder.Write("plans/top.yaml", "x: [{ include: a.yaml }, { include: nowhere.yaml }]\n");
        _folder.Write("plans/a.yaml", "a: [\n");

        var document = Load();

        Assert.DoesNotContain(_folder.Path, ProblemText.Render(_problems.All), StringComparison.Ordinal);
        Assert.DoesNotContain(document!.Inputs, input => Path.IsPathRooted(input.Path));
    }
}
