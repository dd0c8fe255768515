namespace Credtrack.Web.Commands;

/// <summary>What this site says today of a document that it issued: whether what it certifies still stands, and that in one sentence.</summary>
public sealed record StoredDocument(bool Stands, string Sentence);
