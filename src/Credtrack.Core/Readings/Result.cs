namespace Credtrack.Core.Readings;

/// <summary>True or false, positive or negative, of the trainee's answers against the truth; ID is indeterminate.</summary>
public enum Result { TP, TN, FP, FN, ID }
