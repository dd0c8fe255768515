namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>A dictionary of a PDF: names without their slash, values as raw text, in their order.</summary>
internal sealed class PdfDictionary
{
    private readonly OrderedDictionary<string, string> entries = [];

    public static PdfDictionary Read(PdfTokens tokens)
    {
        var read = new PdfDictionary();
        if (!tokens.Takes("<<")) throw new InvalidDataException("The PDF has something else where a dictionary belongs.");
        while (!tokens.Takes(">>")) read.entries.Add(tokens.Next()[1..], tokens.Next());
        return read;
    }

    public string? this[string name]
    {
        get => entries.GetValueOrDefault(name);
        set
        {
            if (value is null) entries.Remove(name);
            else entries[name] = value;
        }
    }

    public override string ToString() => $"<< {string.Join(' ', entries.Select(e => $"/{e.Key} {e.Value}"))} >>";
}
