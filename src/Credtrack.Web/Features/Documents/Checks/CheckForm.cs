using System.ComponentModel.DataAnnotations;

namespace Credtrack.Web.Features.Documents.Checks;

public sealed class CheckForm : IValidatableObject
{
    public const int LongestFile = 10 * 1024 * 1024;

    [Display(Name = "Choose the PDF, or drop it here")]
    public IFormFile? File { get; set; }

    [Display(Name = "Number under the square code"), StringLength(60, ErrorMessage = "The number has five groups of four letters and digits.")]
    public string? Code { get; set; }

    public IEnumerable<ValidationResult> Validate(ValidationContext validationContext)
    {
        if (File is null && string.IsNullOrWhiteSpace(Code)) yield return new("Choose the PDF, or enter the number that is printed under the square code.", [nameof(Code)]);
        if (File is null && !string.IsNullOrWhiteSpace(Code) && DocumentCode.Read(Code) is null) yield return new("The number has five groups of four letters and digits, as printed.", [nameof(Code)]);
        if (File?.Length > LongestFile) yield return new("This file is larger than 10 MB; a summary of ours never is.", [nameof(File)]);
    }
}
