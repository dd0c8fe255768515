namespace Credtrack.Core.Rulebooks;

/// <summary>Something wrong in a rulebook's file: where, as a JSON path, and what was expected there.</summary>
public sealed record Fault(string Path, string Expected)
{
    public override string ToString() => $"{Path}: {Expected}";
}
