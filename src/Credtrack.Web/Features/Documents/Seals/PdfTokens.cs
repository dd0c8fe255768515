using System.Text.RegularExpressions;

namespace Credtrack.Web.Features.Documents.Seals;

/// <summary>Reads values of a PDF one after the other, each as its raw text (ISO 32000-1, 7.2 and 7.3). For documents of our own making only.</summary>
internal sealed partial class PdfTokens(string text, int at)
{
    private const string Spaces = "\0\t\n\f\r ";
    private const string Ends = "()<>[]{}/%" + Spaces;

    public string Next()
    {
        SkipSpace();
        var start = at;
        Pass();
        return text[start..at];
    }

    public bool Takes(string word)
    {
        SkipSpace();
        if (string.CompareOrdinal(text, at, word, 0, word.Length) != 0) return false;
        at += word.Length;
        return true;
    }

    private void Pass()
    {
        if (Takes("<<")) PassUntil(">>");
        else if (Takes("[")) PassUntil("]");
        else if (Takes("(")) PassString();
        else if (Takes("<")) at = text.IndexOf('>', at) + 1;
        else if (Reference().Match(text, at) is { Success: true } reference) at += reference.Length;
        else PassWord();
    }

    private void PassUntil(string end)
    {
        while (!Takes(end)) Pass();
    }

    private void PassString()
    {
        for (var depth = 1; depth > 0; at++)
        {
            if (text[at] == '\\') at++;
            else if (text[at] == '(') depth++;
            else if (text[at] == ')') depth--;
        }
    }

    private void PassWord()
    {
        var start = at++;
        while (at < text.Length && !Ends.Contains(text[at])) at++;
        if (start >= text.Length) throw new InvalidDataException("The PDF ends in the middle of a value.");
    }

    private void SkipSpace()
    {
        while (at < text.Length && (Spaces.Contains(text[at]) || text[at] == '%'))
        {
            if (text[at] == '%') at = text.IndexOfAny(['\r', '\n'], at);
            at = at < 0 ? text.Length : at + 1;
        }
    }

    [GeneratedRegex(@"\G\d+\s+\d+\s+R\b")]
    private static partial Regex Reference();
}
