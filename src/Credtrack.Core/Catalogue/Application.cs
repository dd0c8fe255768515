using Credtrack.Core.People;

namespace Credtrack.Core.Catalogue;

/// <summary>A type of examination. Its views, questions and soft ranges are the site's data; a scan keeps its own copy of what it was asked.</summary>
public sealed class Application : Recorded
{
    public string Code { get; private init; } = "";
    public string Name { get; private init; } = "";
    public ApplicationKind Kind { get; private init; }
    public string Transducer { get; private init; } = "";
    public int FrequencyFromKhz { get; private init; }
    public int FrequencyToKhz { get; private init; }
    public int DepthFromMm { get; private init; }
    public int DepthToMm { get; private init; }
    public string? Note { get; private init; }
    public IReadOnlyList<View> Views { get; private init; } = [];
    public IReadOnlyList<Question> Questions { get; private init; } = [];
    public IReadOnlyList<string> Subtypes { get; private init; } = [];

    private Application() { }

    public static Application List(Person by, CatalogueEntry entry, DateTime at)
    {
        var application = new Application
        {
            Id = Guid.CreateVersion7(at),
            Code = entry.Code,
            Name = entry.Name,
            Kind = entry.Kind,
            Transducer = entry.Transducer,
            FrequencyFromKhz = (int)Math.Round(entry.FrequencyMHz[0] * 1000),
            FrequencyToKhz = (int)Math.Round(entry.FrequencyMHz[1] * 1000),
            DepthFromMm = (int)Math.Round(entry.DepthCm[0] * 10),
            DepthToMm = (int)Math.Round(entry.DepthCm[1] * 10),
            Note = entry.Note,
            Views = entry.Views,
            Questions = entry.Questions,
            Subtypes = entry.Subtypes ?? [],
        };
        application.Record(new ApplicationListed(by, at, entry.Code, entry.Name));
        return application;
    }

    /// <summary>The questions that give a scan its result: those with a positive answer; of a procedure, whether the target was reached.</summary>
    public bool Decides(Question question) => Kind == ApplicationKind.Procedure ? question.Code == Question.TargetReached : question.Positive is not null;
}

public enum ApplicationKind { Diagnostic, Procedure }

public sealed record ApplicationListed(Person By, DateTime At, string Code, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} listed {Name} ({Code}) in the catalogue.";
}
