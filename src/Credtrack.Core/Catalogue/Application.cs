using Credtrack.Core.People;

namespace Credtrack.Core.Catalogue;

public enum ApplicationKind { Diagnostic, Procedure }

/// <summary>A type of examination. Its views, questions and soft ranges are the site's data; a scan keeps its own copy of what it was asked.</summary>
public sealed partial class Application : Recorded
{
    /// <summary>Far above what a site can tell apart; it keeps every list of applications short.</summary>
    public const int MostApplications = 200;

    public string Code { get; private init; } = "";
    public string Name { get; private set; } = "";
    public ApplicationKind Kind { get; private init; }
    public string Transducer { get; private set; } = "";
    public int FrequencyFromKhz { get; private set; }
    public int FrequencyToKhz { get; private set; }
    public int DepthFromMm { get; private set; }
    public int DepthToMm { get; private set; }
    public string? Note { get; private set; }
    public IReadOnlyList<View> Views { get; private set; } = [];
    public IReadOnlyList<Question> Questions { get; private set; } = [];
    public IReadOnlyList<string> Subtypes { get; private set; } = [];

    private Application() { }

    /// <summary>As it is shipped: how the catalogue of a site begins.</summary>
    public static Application List(Person by, CatalogueEntry entry, DateTime at)
    {
        var application = new Application { Id = Guid.CreateVersion7(at), Code = entry.Code, Kind = entry.Kind };
        application.Take(new(entry.Name, entry.Transducer, (int)Math.Round(entry.DepthCm[0] * 10), (int)Math.Round(entry.DepthCm[1] * 10),
            (int)Math.Round(entry.FrequencyMHz[0] * 1000), (int)Math.Round(entry.FrequencyMHz[1] * 1000), entry.Note, entry.Views, entry.Questions, entry.Subtypes ?? []));
        application.Record(new ApplicationListed(by, at, entry.Code, entry.Name));
        return application;
    }

    public static string? WhyNotAdd(Person by, IReadOnlyCollection<Application> catalogue) =>
          !by.Is(MembershipKind.Coordinator) ? OnlyCoordinators
        : catalogue.Count >= MostApplications ? $"A catalogue holds {MostApplications} applications at most."
        : null;

    public static string? WhyNotCode(string code, IEnumerable<Application> catalogue) =>
          !Codes.IsCode(code) ? $"Write the code in small letters, digits and single hyphens, such as arrest-echo, within {Codes.Longest} characters."
        : catalogue.Any(a => a.Code == code) ? "Another application has this code; a retired one keeps its own too."
        : null;

    /// <summary>The code and the kind are for good: scans and rulebooks are judged by them.</summary>
    public static Application Add(Person by, string code, ApplicationKind kind, ApplicationEntry entry, IReadOnlyCollection<Application> catalogue, DateTime at)
    {
        RuleBroken.If(WhyNotAdd(by, catalogue) ?? WhyNotCode(code, catalogue) ?? entry.Faults(kind, catalogue).Select(f => f.Why).FirstOrDefault());
        var application = new Application { Id = Guid.CreateVersion7(at), Code = code, Kind = kind };
        application.Take(entry);
        application.Record(new ApplicationListed(by, at, code, entry.Name));
        return application;
    }

    /// <summary>The questions that give a scan its result: those with a positive answer; of a procedure, whether the target was reached.</summary>
    public bool Decides(Question question) => Kind == ApplicationKind.Procedure ? question.Code == Question.TargetReached : question.Positive is not null;

    private void Take(ApplicationEntry entry)
    {
        (Name, Transducer, Note) = (entry.Name, entry.Transducer, entry.Note);
        (DepthFromMm, DepthToMm, FrequencyFromKhz, FrequencyToKhz) = (entry.DepthFromMm, entry.DepthToMm, entry.FrequencyFromKhz, entry.FrequencyToKhz);
        (Views, Questions, Subtypes) = (entry.Views, entry.Questions, entry.Subtypes);
    }
}
