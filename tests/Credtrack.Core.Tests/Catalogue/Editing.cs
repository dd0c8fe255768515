using Credtrack.Core.Catalogue;

namespace Credtrack.Core.Tests.Catalogue;

/// <summary>How a coordinator goes about the catalogue.</summary>
internal static class Editing
{
    public static ApplicationEntry EntryOf(Application of) => new(
        of.Name, of.Transducer, of.DepthFromMm, of.DepthToMm, of.FrequencyFromKhz, of.FrequencyToKhz, of.Note, of.Views, of.Questions, of.Subtypes);

    /// <summary>As many of everything as there may be, each as long as it may be, of one letter.</summary>
    public static ApplicationEntry Largest(string letter, string mark) => new(
        Long(letter, ApplicationEntry.LongestName), Long(letter, ApplicationEntry.LongestTransducer), 10, 400, 500, 60_000, Long(letter, ApplicationEntry.LongestNote),
        [.. Numbers.Select(n => new View(Code(n), Long(letter, ApplicationEntry.LongestView, $"{mark}{n}"), ViewNeed.OneOf, Long(letter, ApplicationEntry.LongestGroup)))],
        [.. Numbers.Select(n => new Question(Code(n), Long(letter, ApplicationEntry.LongestQuestion, $"{mark}{n}"), Answer.Yes))],
        [.. Numbers.Select(Code)]);

    private static IEnumerable<int> Numbers => Enumerable.Range(10, ApplicationEntry.Most);

    private static string Code(int n) => $"{new string('a', Codes.Longest - 2)}{n}";

    private static string Long(string letter, int length, string mark = "") => mark + string.Concat(Enumerable.Repeat(letter, (length - mark.Length) / (letter.Length == 1 ? 1 : 12)));
}
