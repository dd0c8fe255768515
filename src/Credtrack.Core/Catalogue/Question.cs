namespace Credtrack.Core.Catalogue;

public enum Answer { Yes, No, Unclear }

/// <summary>A focused question. Positive is the answer that counts as a finding (lung sliding: no); null where it is no diagnosis.</summary>
public sealed record Question(string Code, string Text, Answer? Positive)
{
    public const string TargetReached = "target-reached";

    public Answered With(Answer? given) => new(Code, Text, Positive, given);
}

/// <summary>A question as it was asked, with what was answered; null while it is open.</summary>
public sealed record Answered(string Code, string Text, Answer? Positive, Answer? Given);
