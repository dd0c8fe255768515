using System.Globalization;
using Credtrack.Web.Features.Shared.Figures;
using Credtrack.Web.Tests.Laws;

namespace Credtrack.Web.Tests.Features.Shared.Figures;

/// <summary>What the geometry sketch drew, read from the files beside this one.</summary>
internal static class Sketched
{
    public static IEnumerable<string[]> Lines(string file) =>
        from line in File.ReadLines(Path.Combine(Sources.Root, "tests/Credtrack.Web.Tests/Features/Shared/Figures", file))
        where line[0] != '#'
        select line.Split(" | ");

    public static (Depth Depth, string Kind, string Svg) Drawing(string[] line) =>
        (new(line[0], line[1], Scans(line[2]), Scans(line[3]), Scans(line[4]), Scans(line[5]), bool.Parse(line[6]), bool.Parse(line[7])), line[8], line[9]);

    private static int Scans(string number) => int.Parse(number, CultureInfo.InvariantCulture);
}
