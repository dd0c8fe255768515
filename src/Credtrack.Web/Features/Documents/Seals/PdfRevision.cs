using System.Globalization;
using System.Text;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>
/// A freshly drawn PDF and what is to follow it as a second revision (ISO 32000-1, 7.5.6). Reads what our own drawing writes: one revision
/// with a classic cross-reference table, nothing encrypted.
/// </summary>
internal sealed class PdfRevision
{
    private readonly string text;
    private readonly Dictionary<int, int> places = [];
    private readonly SortedDictionary<int, string> changed = [];
    private readonly PdfDictionary trailer;
    private readonly int table;
    private int size;

    public PdfRevision(byte[] pdf)
    {
        text = Encoding.Latin1.GetString(pdf); // one character for each byte
        table = Number(new PdfTokens(text, text.LastIndexOf("startxref", StringComparison.Ordinal) + "startxref".Length).Next());
        var tokens = new PdfTokens(text, table);
        if (!tokens.Takes("xref")) throw Unfit("its cross-reference table is of another kind");
        while (!tokens.Takes("trailer")) ReadPlaces(tokens);
        trailer = PdfDictionary.Read(tokens);
        if (trailer["Prev"] is not null || trailer["Encrypt"] is not null) throw Unfit("it was changed or encrypted after it was drawn");
        size = Number(trailer["Size"]!);
    }

    /// <summary>The reference to the catalog, the first object of all.</summary>
    public string Root => trailer["Root"]!;

    public string FirstPage()
    {
        for (var node = Dictionary(Root)["Pages"]!; ;)
        {
            if (Dictionary(node)["Kids"] is not { } kids) return node;
            node = Items(kids).First();
        }
    }

    /// <summary>The dictionary of a reference, or one that stands in its place.</summary>
    public PdfDictionary Dictionary(string value) => PdfDictionary.Read(new PdfTokens(Resolved(value), 0));

    /// <summary>The values of an array, or of a reference to one.</summary>
    public IEnumerable<string> Items(string value)
    {
        var tokens = new PdfTokens(Resolved(value), 0);
        if (!tokens.Takes("[")) throw Unfit("it has something else where an array belongs");
        while (!tokens.Takes("]")) yield return tokens.Next();
    }

    public string Add(string value)
    {
        changed[size] = value;
        return $"{size++} 0 R";
    }

    public void Replace(string reference, PdfDictionary value) => changed[NumberOf(reference)] = value.ToString();

    /// <summary>Both revisions as one file.</summary>
    public byte[] Written()
    {
        var (written, table) = (new StringBuilder(text), new StringBuilder("xref\n"));
        if (text[^1] != '\n') written.Append('\n');
        foreach (var (number, value) in changed)
        {
            table.Append(CultureInfo.InvariantCulture, $"{number} 1\n{written.Length:D10} 00000 n \n");
            written.Append(CultureInfo.InvariantCulture, $"{number} 0 obj\n{value}\nendobj\n");
        }
        (trailer["Size"], trailer["Prev"]) = ($"{size}", $"{this.table}");
        var start = written.Length;
        written.Append(table).Append(CultureInfo.InvariantCulture, $"trailer\n{trailer}\nstartxref\n{start}\n%%EOF\n");
        return Encoding.Latin1.GetBytes(written.ToString());
    }

    private void ReadPlaces(PdfTokens tokens)
    {
        var (first, count) = (Number(tokens.Next()), Number(tokens.Next()));
        for (var number = first; number < first + count; number++)
        {
            var place = Number(tokens.Next());
            tokens.Next();
            if (tokens.Next() == "n") places[number] = place;
        }
    }

    private string Resolved(string value)
    {
        if (!value.EndsWith('R')) return value;
        var tokens = new PdfTokens(text, places[NumberOf(value)]);
        tokens.Next();
        tokens.Next();
        return tokens.Takes("obj") ? tokens.Next() : throw Unfit("its cross-reference table points beside an object");
    }

    private static int NumberOf(string reference) => Number(reference[..reference.IndexOf(' ', StringComparison.Ordinal)]);

    private static int Number(string digits) => int.Parse(digits, NumberStyles.None, CultureInfo.InvariantCulture);

    private static InvalidDataException Unfit(string why) => new($"This PDF is not sealed: {why}.");
}
