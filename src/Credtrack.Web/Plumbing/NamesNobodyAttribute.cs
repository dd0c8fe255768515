using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Plumbing;

namespace Credtrack.Web.Plumbing;

/// <summary>[NamesNobody]: words that stay with a record and must not identify a patient. The sentences are the core's.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class NamesNobodyAttribute : ValidationAttribute
{
    protected override ValidationResult? IsValid(object? value, ValidationContext validationContext) =>
        FreeText.WhyNotKeep(value as string) is { } why ? new(why, [validationContext.MemberName!]) : ValidationResult.Success;
}
