using System.ComponentModel.DataAnnotations;
using System.Security.Cryptography;
using System.Text;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Rulebooks.Templates;
using Microsoft.AspNetCore.Mvc.ModelBinding;

namespace Credtrack.Web.Features.Rulebooks;

/// <summary>The next rulebook of a programme: its text comes from a template, from a file or is typed; it is looked at in words, then published.</summary>
public sealed class RulebookForm
{
    /// <summary>Far above the longest rulebook, so that a file that is none is answered in words.</summary>
    public const int LongestForm = 32 * 1024 * 1024;

    // A character takes three bytes at most, and the mark of order as many.
    private const int LongestFile = 3 * Rulebook.LongestText + 3;

    public Guid Programme { get; set; }

    /// <summary>The version that publishing was going to make when the page was shown.</summary>
    public int NextVersion { get; set; }

    /// <summary>Digest of the text that was shown in words.</summary>
    public string? Shown { get; set; }

    public string? Template { get; set; }

    public IFormFile? File { get; set; }

    [Display(Name = "Rulebook as JSON")]
    public string? Text { get; set; }

    /// <summary>Which button: "template", "file", "publish", else look at the text.</summary>
    public string? As { get; set; }

    public bool Publishes => As == "publish";

    public static string Digest(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));

    /// <summary>What was asked for takes the place of the text. Line ends become those of Unix, because a browser sends others than a file has.</summary>
    public async Task Take(ModelStateDictionary typed)
    {
        var (taken, fault) = As switch
        {
            "template" => (Core.Rulebooks.Templates.Template.Find(Template ?? "")?.Text, "Choose a template."),
            "file" => await FromFile(),
            _ => (Text, "Give the rulebook as JSON: from a template, from a file, or typed here."),
        };
        if (string.IsNullOrWhiteSpace(taken)) typed.AddModelError(As switch { "template" => "Form.Template", "file" => "Form.File", _ => "Form.Text" }, fault);
        else if (As is "template" or "file") typed.Remove("Form.Text");
        Text = (string.IsNullOrWhiteSpace(taken) ? Text : taken)?.Replace("\r\n", "\n", StringComparison.Ordinal).Replace('\r', '\n');
    }

    private async Task<(string? Text, string Fault)> FromFile()
    {
        if (File is not { Length: > 0 }) return (null, "Choose a file that is not empty.");
        if (File.Length > LongestFile) return (null, FormattableString.Invariant($"This file has {File.Length:N0} bytes; a rulebook has at most {Rulebook.LongestText:N0} characters. Choose another file."));
        using var bytes = new MemoryStream();
        await File.CopyToAsync(bytes);
        return (Utf8Text.Read(bytes.ToArray(), out var fault), fault ?? "This file is blank. Choose another one.");
    }
}
