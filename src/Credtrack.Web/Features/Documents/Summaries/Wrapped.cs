using System.Globalization;
using System.Text;
using PdfSharp.Drawing;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>Text broken into lines of a width. Nothing is dropped: a word that is wider than the line goes on in the next.</summary>
internal static class Wrapped
{
    /// <param name="width">In points.</param>
    public static List<string> Into(double width, string text, XFont font, XGraphics measure)
    {
        var lines = new List<string>();
        foreach (var paragraph in text.Normalize().ReplaceLineEndings("\n").Split('\n'))
        {
            var line = "";
            foreach (var word in paragraph.Split(' ', StringSplitOptions.RemoveEmptyEntries).SelectMany(w => Pieces(w)))
            {
                var longer = line.Length == 0 ? word.Text : $"{line}{(word.Starts ? " " : "")}{word.Text}";
                if (line.Length > 0 && Wide(longer) > width)
                {
                    // Who copies the text out gets the space that the end of the line stands for.
                    lines.Add(word.Starts ? line + " " : line);
                    longer = word.Text;
                }
                line = longer;
            }
            lines.Add(line);
        }
        return lines;

        double Wide(string part) => measure.MeasureString(part, font).Width;

        IEnumerable<(string Text, bool Starts)> Pieces(string word)
        {
            if (Wide(word) <= width) return [(word, true)];
            var pieces = new List<(string, bool)>();
            var piece = new StringBuilder();
            for (var letters = StringInfo.GetTextElementEnumerator(word); letters.MoveNext();)
            {
                if (piece.Length > 0 && Wide($"{piece}{letters.Current}") > width)
                {
                    pieces.Add((piece.ToString(), pieces.Count == 0));
                    piece.Clear();
                }
                piece.Append(letters.Current);
            }
            pieces.Add((piece.ToString(), pieces.Count == 0));
            return pieces;
        }
    }
}
