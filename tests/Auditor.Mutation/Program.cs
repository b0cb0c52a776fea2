using Auditor.Mutation;

if (args is ["--within", var tests, var what, var about])
{
    var trials = new Trials(tests);
    if (what == "cover")
    {
        trials.Cover(int.Parse(about));
    }
    else
    {
        trials.Try(File.ReadLines(about));
    }

    return 0;
}

return Whole.Run(args);
