namespace Auditor.Mutation;

/// <summary>The class by which the mutated code asks which mutant is at work; it is compiled into the lowest of the mutated assemblies.</summary>
internal static class Switch
{
    public const string FullName = "AuditorMutants.Switch";

    public const string Source = """
        namespace AuditorMutants;

        public static class Switch
        {
            public static volatile int Active;

            public static bool[] Seen;

            public static bool Is(int mutant)
            {
                var seen = Seen;
                if (seen != null)
                {
                    seen[mutant] = true;
                }

                return Active == mutant;
            }
        }
        """;
}
