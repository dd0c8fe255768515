using Credtrack.Web.Features.Documents.Summaries;

namespace Credtrack.Web.Tests.Features.Documents.Summaries;

/// <summary>Invented facts to draw.</summary>
internal static class Samples
{
    public static SummaryLine Biliary { get; } = new("Biliary", 41, 40, 38,
    [
        ("Scans that count, at least 25", "38", true),
        ("of these positive, at least 5", "14", true),
        ("of these directly supervised, at least 10", "16", true),
        ("Accuracy, lower bound (95 %, one-sided), at least 80 %", "81.4 % (Wilson)", true),
        ("LC-CUSUM limit 2.95 reached", "at scan 27", true),
        ("Written examination", "passed on 12 October 2026", true),
    ])
    { Required = 25 };

    public static SummaryFacts Met { get; } = new()
    {
        Holder = "Tobias Achterkamp",
        Programme = "Emergency medicine residency",
        Site = "Brindlemoor General",
        DocumentCode = "K7QX-4M2P-9TBD",
        CheckAddress = "https://credtrack.brindlemoor.example/check/K7QX-4M2P-9TBD",
        Lines = [Biliary],
        Privilege = "Biliary ultrasound without supervision",
        GrantedFrom = new(2026, 11, 4),
        RulebookName = "Brindlemoor emergency",
        RulebookVersion = "4",
        AsOf = new(2026, 11, 3, 13, 2, 11, DateTimeKind.Utc),
        SignerName = "Dr Seraphine Okwuosa-Lund",
        SignerRole = "Programme director",
        SignedAt = new(2026, 11, 3, 14, 20, 5, DateTimeKind.Utc),
        ZoneId = "Europe/Berlin",
        Meaning = "Approved: the holder may do this without supervision",
        CertificateFingerprint = "04D2 A309 4140 DF77 7DAE 1BE5 BA1C 5853 F68A 94C1 32F8 D12F 6F66 0D9D ABD4 4A0B",
    };

    public static SummaryFacts OverAGap { get; } = Met with
    {
        Lines = [Biliary with { Counted = 22, Requirements = [("Scans that count, at least 25", "22", false), .. Biliary.Requirements.Skip(1).Take(4), ("Written examination", "not taken", false)] }],
        GapReason = "The holder has shown the technique at the bedside twice; the missing scans are planned for next week.",
    };

    /// <summary>So many requirements that they need several pages, each with words that stand nowhere else.</summary>
    public static SummaryFacts Long { get; } = Met with
    {
        Holder = "Zażółć Gęślą-Jaźń Nguyễn Thị Ελευθερία Жуковская von und zu Hohenschwangau-Ober",
        Lines = [Biliary with { Requirements = [.. Enumerable.Range(1, 30).Select(n => ($"Requirement number {n}, as long as those who write rulebooks for hospitals make them", $"value {n}", n % 7 != 0))] }],
    };
}
