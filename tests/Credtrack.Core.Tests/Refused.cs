namespace Credtrack.Core.Tests;

internal static class Refused
{
    /// <summary>The question gives the reason, and the verb refuses with the same one.</summary>
    public static void With(string reason, string? whyNot, Action verb)
    {
        Assert.Equal(reason, whyNot);
        With(reason, verb);
    }

    public static void With(string reason, Action verb) => Assert.Equal(reason, Assert.Throws<RuleBroken>(verb).Message);
}
