namespace Credtrack.Core;

/// <summary>What a row says of itself, as the fact of that kind said it when it was written: by whom (null if the row does not tell), when, and the fact's own values by their names.</summary>
public sealed record RowClaim(string Fact, Guid? By, DateTime At, params IReadOnlyList<(string Key, string? Value)> Says);
