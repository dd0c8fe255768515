using System.ComponentModel.DataAnnotations;
using Credtrack.Core.Plumbing;

namespace Credtrack.Web.Plumbing;

/// <summary>[OneLine]: a name, or what else stands in a line of a page, a letter or a paper. The sentence is the core's.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class OneLineAttribute : ValidationAttribute
{
    protected override ValidationResult? IsValid(object? value, ValidationContext validationContext) =>
        value is string text && TextLine.WhyNot(text, int.MaxValue) is { } why ? new(why, [validationContext.MemberName!]) : ValidationResult.Success;
}
